import { fireEvent, screen, waitFor, within } from '@testing-library/react';
import { describe, expect, it } from 'vitest';
import { renderPage } from '../../../testing/render';
import ChainPage from './ChainPage';

const AT = '/level-bench/chain';
const answer = () => screen.getByLabelText('Answer');

describe('the chain', () => {
  it('takes a stage’s gain as it is typed, and holds every stage in the address', async () => {
    const { router } = renderPage(<ChainPage />, { at: `${AT}?inputDbm=-10&stages=Mixer_-6*Driver_20__4` });
    // By hand: −10 − 6 + 20 = +4 dBm; Friis: a loss of 6 dB before 4 dB is 10 dB.
    expect(await within(answer()).findByText('+4.0')).toBeVisible();
    expect(within(answer()).getByText('10.0')).toBeVisible();
    fireEvent.click(within(screen.getByLabelText('Stages')).getByText('Driver'));
    const gain = screen.getByLabelText('Gain, a loss negative');
    fireEvent.change(gain, { target: { value: '17 dB' } });
    expect(await within(answer()).findByText('+1.0')).toBeVisible();
    await waitFor(() =>
      expect(new URLSearchParams(router.state.location.search).get('stages')).toBe(
        'Mixer_-6*Driver_17 dB__4',
      ),
    );
  });

  it('adds, moves and removes a stage', async () => {
    renderPage(<ChainPage />, { at: `${AT}?stages=Mixer_-6*Driver_20` });
    fireEvent.click(await screen.findByText('Add a stage'));
    fireEvent.click(screen.getByLabelText('Move up'));
    const names = () =>
      within(screen.getByRole('table', { name: 'Stage by stage' }))
        .getAllByRole('rowheader')
        .map(({ textContent }) => textContent);
    await waitFor(() => expect(names()).toEqual(['Mixer', 'Stage 3', 'Driver']));
    fireEvent.click(screen.getByText('Remove'));
    await waitFor(() => expect(names()).toEqual(['Mixer', 'Driver']));
  });

  it('keeps the last good result and says at the field what cannot be, once it is left', async () => {
    renderPage(<ChainPage />, { at: `${AT}?inputDbm=0&stages=Driver_20__4` });
    expect(await within(answer()).findByText('+20.0')).toBeVisible();
    fireEvent.click(within(screen.getByLabelText('Stages')).getByText('Driver'));
    const noise = screen.getByLabelText('Noise figure');
    fireEvent.change(noise, { target: { value: '-4' } });
    fireEvent.blur(noise);
    expect(await screen.findByText(/Noise figure of Driver: -4 is outside/)).toBeVisible();
    expect(within(answer()).getByText('+20.0')).toBeVisible();
    expect(noise).toHaveValue('-4');
  });
});
