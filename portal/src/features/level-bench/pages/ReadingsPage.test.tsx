import { fireEvent, screen, waitFor, within } from '@testing-library/react';
import { describe, expect, it } from 'vitest';
import { renderPage } from '../../../testing/render';
import ReadingsPage from './ReadingsPage';

const AT = '/level-bench/readings';

describe('the readings', () => {
  // By hand: 10 mV/div × 6.7 div × 10 = 0.67 V p-p in 50 ohm, 1.122 mW, +0.50 dBm.
  it('turn divisions into a level with its uncertainty and verdict, while typing, and keep them in the address', async () => {
    const { router } = renderPage(<ReadingsPage />, { at: AT });
    expect(await screen.findByText('+0.37')).toBeVisible();
    const scale = screen.getByLabelText('Volts per division');
    fireEvent.change(scale, { target: { value: '10m' } });
    const divisions = screen.getByLabelText('Divisions, peak to peak');
    fireEvent.change(divisions, { target: { value: '6.7' } });
    expect(await screen.findByText('+0.50')).toBeVisible();
    expect(screen.getByText('± 0.39 dB at 95 %')).toBeVisible();
    expect(await within(screen.getByLabelText('Against the window')).findByText('Pass')).toBeVisible();
    await waitFor(() =>
      expect(router.state.location.search).toBe(
        '?oscilloscope.voltsPerDivision=10m&oscilloscope.divisionsPeakToPeak=6.7',
      ),
    );
  });

  it('have the budget as a table for a screen reader while the bars are shown', async () => {
    renderPage(<ReadingsPage />, { at: `${AT}?way=harmonic` });
    const table = await screen.findByRole('table', { name: 'Uncertainty budget' });
    expect(within(table).getAllByRole('row')).toHaveLength(5);
    expect(table).toHaveTextContent('Flatness± 0.8 dBRectangular');
  });

  it('say at the field what is out of its domain, and keep what was typed', async () => {
    renderPage(<ReadingsPage />, { at: AT });
    const divisions = await screen.findByLabelText('Divisions, peak to peak');
    fireEvent.change(divisions, { target: { value: '33' } });
    fireEvent.blur(divisions);
    expect(await screen.findByText(/Divisions, peak to peak: 33 is outside/)).toBeVisible();
    expect(divisions).toHaveValue('33');
    expect(screen.getByText('+0.37')).toBeVisible();
  });
});
