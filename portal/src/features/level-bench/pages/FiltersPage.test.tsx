import { screen, waitFor, within } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import { describe, expect, it } from 'vitest';
import { renderPage } from '../../../testing/render';
import FiltersPage from './FiltersPage';

const AT = '/level-bench/filters';

// What a five-element Chebyshev of 20 dB return loss and 15.5 MHz edge takes at 28 MHz by the handbook's formula,
// 10·log(1 + ε²·T5²(28/15.5)), is 26.0 dB; nearest parts with their Q leave 26.1.
describe('the filters page', () => {
  it('says what is taken of each harmonic, what is in hand, and what a thousand builds make of it', async () => {
    renderPage(<FiltersPage />, { at: AT });
    const answer = await screen.findByLabelText('Answer');
    expect(await within(answer).findByText('26.1')).toBeVisible();
    expect(await within(answer).findByText(/^4\.1 dB in hand, 2\.\d at worst$/)).toBeVisible();
    expect(within(answer).getByText(/^16 or more in \d+ of 1,000$/)).toBeVisible();
    expect(screen.getByText(/^All of them pass\. The least is 24\.\d dB\.$/)).toBeVisible();
    expect(screen.getByText('43 + 10 log 5.01 W gives 50.0 dB; it never asks more than 50.')).toBeVisible();
    expect(screen.getByLabelText('Parts to fit', { selector: 'table' })).toHaveTextContent(
      'C3370 pF220 + 150 pF',
    );
  });

  it('follows the typing, keeps it in the address and says what is wrong at its field', async () => {
    const { router } = renderPage(<FiltersPage />, { at: AT });
    const field = await screen.findByLabelText('Part tolerance');
    // 5 becomes 55.
    await userEvent.type(field, '5');
    await userEvent.tab();
    expect(await screen.findByText('Part tolerance: needed is 0 to 50 %.')).toBeVisible();
    expect(field).toHaveValue('55');
    expect(screen.getByLabelText('Answer')).toHaveTextContent('26.1');
    await waitFor(() => expect(router.state.location.search).toBe('?toleranceRel=55'));
  });

  it('offers to trim the resonators of a band-pass, and says what the builds then are', async () => {
    renderPage(<FiltersPage />, { at: `${AT}?kind=band-pass` });
    expect(await screen.findByText(/the builds here are without/)).toBeVisible();
    await userEvent.click(screen.getByRole('combobox', { name: 'Resonators' }));
    await userEvent.click(await screen.findByRole('option', { name: 'Trimmed to the centre' }));
    expect(await screen.findByText(/the builds here are turned to the centre/)).toBeVisible();
  });

  it('walks the plot by the keyboard and turns it into its table', async () => {
    renderPage(<FiltersPage />, { at: AT });
    const plot = await screen.findByLabelText(/^Filter plot/);
    plot.focus();
    await userEvent.keyboard('h');
    expect(plot.querySelector('[role=status]')).toHaveTextContent(
      /^28\.00 MHz\. Gain −26\.\d dB.*Second harmonic: 22\.0 needed/,
    );
    await userEvent.keyboard('t');
    await waitFor(() => expect(screen.queryByLabelText(/^Filter plot/)).not.toBeInTheDocument());
    const table = screen.getByLabelText('Response', { selector: 'table' });
    expect(table).toBeVisible();
    expect(within(table).getByText('28.00').closest('tr')).toHaveTextContent(
      /^28\.00−26\.\d.*22\.024\.\dPass$/,
    );
  });

  it('opens a link to what cannot be with words at its field, and no empty result', async () => {
    renderPage(<FiltersPage />, { at: `${AT}?seed=1.5` });
    expect(await screen.findByText(/^Seed of the builds: needed is a whole number/)).toBeVisible();
    expect(screen.getByText(/^The filter shows here once/)).toBeVisible();
    expect(screen.queryByLabelText('Answer')).not.toBeInTheDocument();
  });
});
