import { screen, waitFor } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import { describe, expect, it } from 'vitest';
import { renderPage } from '../../../testing/render';
import ConversionsPage from './ConversionsPage';

const AT = '/level-bench/conversions';

describe('the conversions', () => {
  // 1 W in 50 ohm is +30 dBm, 7.07 V rms, 10 V peak: P = V²/R.
  it('tell a power as level and volts while it is typed, and keep it in the address as it was typed', async () => {
    const { router } = renderPage(<ConversionsPage />, { at: `${AT}?from=watts` });
    const field = await screen.findByLabelText('Power');
    await userEvent.clear(field);
    await userEvent.type(field, '1000m');
    expect(await screen.findByText('+30.00')).toBeVisible();
    expect(screen.getByRole('table')).toHaveTextContent('Volts peak10 V');
    await waitFor(() => expect(router.state.location.search).toBe('?from=watts&watts=1000m'));
  });

  it('keep the last good result while a field is half typed, and say what is wrong on leaving it', async () => {
    renderPage(<ConversionsPage />, { at: `${AT}?dbm=10&resistance=600` });
    expect(await screen.findByText('+10.00')).toBeVisible();
    const field = screen.getByLabelText('Resistance');
    await userEvent.clear(field);
    await userEvent.type(field, '-5');
    expect(screen.getByText('+10.00')).toBeVisible();
    await userEvent.tab();
    expect(await screen.findByText(/Resistance: -5 is outside/)).toBeVisible();
    expect(field).toHaveValue('-5');
  });

  it('leave a field alone that is not on the page', async () => {
    renderPage(<ConversionsPage />, { at: `${AT}?from=dbm&watts=nonsense&dbm=20` });
    expect(await screen.findByText('+20.00')).toBeVisible();
  });

  // Two signals of 0 dBm each: 10 log 2 = 3.01 dB more together.
  it('add levels that share a resistance, and mark them on the drawn rule', async () => {
    renderPage(<ConversionsPage />, { at: `${AT}?calculation=sum&second=0` });
    // As the sum, and as what it is over the stronger.
    expect(await screen.findAllByText('+3.01')).toHaveLength(2);
    expect(screen.getByRole('img', { name: 'A rule of levels: First, Second, together +3.0' })).toBeVisible();
    expect(screen.queryByLabelText('What is known')).not.toBeInTheDocument();
  });
});
