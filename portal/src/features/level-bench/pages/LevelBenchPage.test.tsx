import { screen } from '@testing-library/react';
import { expect, it } from 'vitest';
import userEvent from '@testing-library/user-event';
import { renderPage } from '../../../testing/render';
import LevelBenchPage from './LevelBenchPage';

it('turns 3.3 divisions at 20 millivolts into a level with its uncertainty, while typing', async () => {
  renderPage(<LevelBenchPage />);
  await userEvent.type(await screen.findByLabelText('Volts per division'), '20m');
  await userEvent.type(screen.getByLabelText('Divisions, peak to peak'), '3.3');
  expect(await screen.findByText('+0.37 ± 0.47 dBm')).toBeVisible();
});

it('reads the analyzer’s divisions down from its reference level', async () => {
  renderPage(<LevelBenchPage />, { at: '/?way=analyzer&divisionsDown=1.65' });
  expect(await screen.findByText(/^−16\.5 ± /)).toBeVisible();
});
