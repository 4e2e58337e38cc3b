import { screen, waitFor, within } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import { describe, expect, it } from 'vitest';
import { keepPreference } from '../../../lib/preferences';
import { renderPage } from '../../../testing/render';
import MatchingPage from './MatchingPage';

const AT = '/level-bench/matching';

describe('matching and windings', () => {
  // Public amateur table: VSWR 2 is 9.54 dB return loss, 11.1 % of the power back.
  it('tell a match every way while it is typed, and keep it in the address', async () => {
    const { router } = renderPage(<MatchingPage />, { at: `${AT}?known=vswr` });
    const field = await screen.findByLabelText('VSWR');
    await userEvent.clear(field);
    await userEvent.type(field, '2');
    const answer = screen.getByRole('region', { name: 'Answer' });
    expect(await within(answer).findByText('9.54')).toBeVisible();
    expect(answer).toHaveTextContent('11.1 % of the power comes back');
    await waitFor(() => expect(router.state.location.search).toBe('?known=vswr&vswr=2'));
  });

  // By hand: 50 to 12.5 ohm has Q √3; at 14.2 MHz 388 pF and 243 nH, or 324 nH and 518 pF.
  it('draw both L-networks with the parts to fit, and have a table for their chart', async () => {
    keepPreference('level-bench-view', 'table');
    renderPage(<MatchingPage />, { at: `${AT}?calculation=l-network` });
    expect(
      await screen.findByRole('img', {
        name: 'Low-pass, Q 1.73: C1 390 pF to ground; L2 8 turns, 269 nH in series',
      }),
    ).toBeVisible();
    expect(screen.getByText('exact C1 388 pF, L2 243 nH')).toBeVisible();
    expect(screen.getByText('exact L1 324 nH, C2 518 pF')).toBeVisible();
    expect(screen.getByRole('table', { name: 'Return loss' })).toHaveTextContent('14.20 MHz');
  });

  it('show only what the chosen calculation asks for, and say what is wrong at its field', async () => {
    renderPage(<MatchingPage />, { at: `${AT}?calculation=air` });
    const length = await screen.findByLabelText('Length of the coil');
    expect(screen.queryByLabelText('VSWR')).not.toBeInTheDocument();
    await userEvent.clear(length);
    await userEvent.type(length, '3');
    await userEvent.tab();
    expect(await screen.findByText(/at least 0\.004/)).toBeVisible();
    expect(length).toBeInvalid();
  });
});
