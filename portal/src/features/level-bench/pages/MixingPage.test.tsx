import { screen, waitFor, within } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import { describe, expect, it } from 'vitest';
import { renderPage } from '../../../testing/render';
import MixingPage from './MixingPage';

const AT = '/level-bench/mixing';
const answer = () => screen.findByRole('region', { name: 'Answer' });

describe('mixing', () => {
  // 23.067 − 8.867 = 14.200; a matched pi pad of 3 dB in 50 ohm is 292, 17.61, 292 ohm, in E24 300, 18, 300.
  it('opens with an answer: wanted frequency, sideband and the pad for the drive', async () => {
    renderPage(<MixingPage />, { at: AT });
    const line = await answer();
    expect(line).toHaveTextContent('14.200 MHz');
    expect(line).toHaveTextContent('Inverted');
    expect(line).toHaveTextContent('Use a 3 dB pad.');
    expect(within(line).getByRole('img', { name: /300, 18, 300 ohm/ })).toBeVisible();
  });

  it('lists wanted first, then the least in hand, with what to do', async () => {
    renderPage(<MixingPage />, { at: AT });
    const table = await screen.findByRole('table', { name: 'Products' });
    const [, wanted, worst] = within(table).getAllByRole('row');
    expect(wanted).toHaveTextContent('LO − IF wanted');
    expect(worst).toHaveTextContent(/LO \+ IF sum.*63\.5 ± 4.*Too close to call.*Measure it/);
    await userEvent.click(screen.getByRole('button', { name: 'Show all' }));
    // To order 7 there are 7·8 products, and the heading.
    expect(within(table).getAllByRole('row')).toHaveLength(57);
  });

  it('is worked out again as the drive is typed, and keeps it in the address', async () => {
    const { router } = renderPage(<MixingPage />, { at: AT });
    const source = await screen.findByLabelText('LO source gives');
    await userEvent.clear(source);
    await userEvent.type(source, '4');
    await waitFor(async () => expect(await answer()).toHaveTextContent('3 dB too weak.'));
    await waitFor(() => expect(router.state.location.search).toBe('?sourceDbm=4'));
  });

  it('opens the upper sideband of a mixer that adds, as a link says', async () => {
    renderPage(<MixingPage />, { at: `${AT}?ifHertz=9&loHertz=5.2&wanted=sum` });
    expect(await answer()).toHaveTextContent(/LO \+ IF.*14\.200.*Kept/);
  });

  it('works out an order above 9 beside the page', async () => {
    renderPage(<MixingPage />, { at: `${AT}?maxOrder=15` });
    // 15·16 products, of which eight are named.
    expect(await screen.findByText(/232 more to order 15/)).toBeVisible();
  });

  it('says at its field what order is permitted, and keeps the answer of before', async () => {
    renderPage(<MixingPage />, { at: AT });
    const order = await screen.findByLabelText('Order up to');
    await userEvent.type(order, '7');
    await userEvent.tab();
    expect(await screen.findByText(/Highest order/)).toBeVisible();
    expect(order).toHaveValue('77');
    expect(await answer()).toHaveTextContent('14.200');
  });

  it('steps through the picture by keys, marks a row and leads to the table', async () => {
    renderPage(<MixingPage />, { at: AT });
    const chart = await screen.findByRole('group', { name: /^Product chart/ });
    chart.focus();
    await userEvent.keyboard('{ArrowDown}{ArrowDown}');
    expect(within(chart).getByRole('status')).toHaveTextContent(/^LO plus IF, 31\.934 megahertz, order 2\./);
    await userEvent.keyboard('{Enter}');
    const row = screen.getByRole('row', { name: /LO \+ IF sum/ });
    expect(row).toHaveAttribute('aria-current', 'true');
    await userEvent.keyboard('t');
    expect(document.activeElement).toContainElement(row);
  });

  it('shows an assumed figure as it is typed over', async () => {
    renderPage(<MixingPage />, { at: `${AT}?conversionLoss=7.2` });
    const assumed = await screen.findByRole('region', { name: 'Figures assumed' });
    expect(assumed).toHaveTextContent('Conversion loss7.2 ± 1 dB');
    expect(assumed).toHaveTextContent('common practice');
    await userEvent.click(within(assumed).getByRole('button', { name: 'Change' }));
    expect(screen.getByLabelText('Conversion loss')).toHaveValue('7.2');
  });

  it('says over the page what is wrong with a figure that is folded away, and lets it be mended', async () => {
    renderPage(<MixingPage />, { at: `${AT}?conversionLoss=-3` });
    expect(await screen.findByText(/Figure of the mixer: -3 is outside/)).toBeVisible();
    expect(screen.queryByRole('region', { name: 'Answer' })).not.toBeInTheDocument();
    await userEvent.click(screen.getByRole('button', { name: 'Change' }));
    await userEvent.clear(screen.getByLabelText('Conversion loss'));
    await userEvent.type(screen.getByLabelText('Conversion loss'), '6');
    expect(await answer()).toHaveTextContent('14.200');
  });

  // 33 dBm are 2 W, of which a pad of 26 dB keeps all but 5 mW.
  it('warns of a pad that gets hot, and of no other', async () => {
    renderPage(<MixingPage />, { at: `${AT}?sourceDbm=33` });
    expect(await screen.findByRole('note', { name: /Hot parts/ })).toHaveTextContent('The pad takes 2 W');
    const source = screen.getByLabelText('LO source gives');
    await userEvent.clear(source);
    await userEvent.type(source, '10');
    await waitFor(() => expect(screen.queryByRole('note')).not.toBeInTheDocument());
  });
});
