import { screen, within } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import { describe, expect, it } from 'vitest';
import { renderPage } from '../../../testing/render';
import PadsPage from './PadsPage';

const AT = '/level-bench/pads';

describe('the pads', () => {
  // 300, 18, 300 ohm between 50 ohm by chain matrices: 2.995 dB, 44.58 dB return loss.
  it('start with the pad of the club plan, drawn and worked out', async () => {
    renderPage(<PadsPage />, { at: AT });
    const answer = await screen.findByRole('region', { name: 'Answer' });
    expect(within(answer).getByText('2.99')).toBeVisible();
    expect(within(answer).getAllByText('44.6')).toHaveLength(2);
    expect(
      screen.getByRole('img', { name: /^pi pad: R1 in to ground 300 ohm, R2 in to out 18 ohm/i }),
    ).toBeVisible();
    expect(screen.getByRole('table', { name: 'Resistors' })).toHaveTextContent('292.4 ohm');
  });

  // Tee of 10 dB, 50 ohm: 25.97 and 35.14 ohm (Lessons in Electric Circuits, worked example).
  it('warn of heat and RF from 1 W on, and not below', async () => {
    renderPage(<PadsPage />, { at: `${AT}?kind=tee&lossDb=10&told=watts&inputWatts=0.99` });
    expect(await screen.findAllByText('25.97 ohm')).toHaveLength(2);
    expect(screen.queryByRole('note')).not.toBeInTheDocument();
    const power = screen.getByLabelText('Power in, average');
    await userEvent.clear(power);
    await userEvent.type(power, '1');
    expect(await screen.findByRole('note', { name: 'Caution: RF power.' })).toBeVisible();
    expect(screen.getByRole('note', { name: 'Caution: Hot parts.' })).toBeVisible();
  });

  // 75 to 50 ohm takes 5.72 dB or more: 20 log(√1.5 + √0.5).
  it('say the least loss two resistances allow, at the field, and keep what was typed', async () => {
    renderPage(<PadsPage />, { at: AT });
    const from = await screen.findByLabelText('From');
    await userEvent.clear(from);
    await userEvent.type(from, '75');
    await userEvent.tab();
    expect(await screen.findByText(/more than 5\.7194\d/)).toBeVisible();
    expect(screen.getByLabelText('Attenuation')).toBeInvalid();
    expect(screen.getByLabelText('Attenuation')).toHaveValue('3');
    expect(screen.getByText('2.99')).toBeVisible();
  });
});
