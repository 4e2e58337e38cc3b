import { fireEvent, screen, waitFor, within } from '@testing-library/react';
import { describe, expect, it } from 'vitest';
import { renderPage } from '../../../testing/render';
import GuardsPage from './GuardsPage';

const AT = '/level-bench/guards';
const answer = () => within(screen.getByLabelText('Answer'));

describe('guards and limits', () => {
  it('judge what the address asks, with its source and its caution beside it', async () => {
    // 47 CFR 97.307(b), by hand: 14.348 MHz and 2.7 kHz above it end 700 Hz over the edge at 14.350 MHz.
    renderPage(<GuardsPage />, { at: `${AT}?judge=band&ruleSet=US-97&carrierHertz=14.348&day=2026-12-01` });
    expect(await answer().findByText('700 Hz of it lie outside the band.')).toBeVisible();
    expect(screen.getByText(/Text of 2026-09-23/)).toBeVisible();
    expect(screen.getByRole('note')).toHaveTextContent(/your licence.*decide/);
  });

  it('draw the way of the heat anew while it is typed, and keep it in the address', async () => {
    const { router } = renderPage(<GuardsPage />, { at: `${AT}?judge=heat&sinkToAir=1` });
    const field = await screen.findByLabelText('Turned to heat');
    fireEvent.change(field, { target: { value: '10' } });
    // By hand: 35 + 10 × (3 + 0.5 + 1) = 80 °C.
    expect(await screen.findByRole('img', { name: /Junction 80 °C/ })).toBeVisible();
    await waitFor(() => expect(router.state.location.search).toBe('?judge=heat&watts=10&sinkToAir=1'));
  });

  it('say at the field what is out of its domain', async () => {
    renderPage(<GuardsPage />, { at: `${AT}?judge=heat` });
    const field = await screen.findByLabelText('Junction to case');
    fireEvent.change(field, { target: { value: '-3' } });
    fireEvent.blur(field);
    expect(await screen.findByText(/Junction to case: -3 is outside/)).toBeVisible();
    expect(field).toHaveValue('-3');
  });
});
