import { render, screen } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import { useState } from 'react';
import { joinUnit, splitTyped } from './phone-unit';
import { QuantityField } from './quantity-field';

function Load() {
  const [text, setText] = useState('');
  return <QuantityField label="Load" unit="ohm" value={text} onChange={setText} />;
}

describe('a quantity field', () => {
  it('keeps what was typed and repeats what was understood', async () => {
    render(<Load />);
    await userEvent.type(screen.getByLabelText('Load'), '4.7k');
    expect(screen.getByLabelText('Load')).toHaveValue('4.7k');
    expect(screen.getByLabelText('Load')).toHaveAccessibleDescription('Read as 4,700 ohm');
  });

  it('says nothing about a plain number', async () => {
    render(<Load />);
    await userEvent.type(screen.getByLabelText('Load'), '50');
    expect(screen.queryByText(/Read as/)).not.toBeInTheDocument();
  });

  it('complains only when the field is left, and keeps the text', async () => {
    render(<Load />);
    await userEvent.type(screen.getByLabelText('Load'), '20 dB');
    expect(screen.getByLabelText('Load')).toBeValid();
    await userEvent.tab();
    expect(screen.getByLabelText('Load')).toBeInvalid();
    expect(screen.getByLabelText('Load')).toHaveValue('20 dB');
  });

  it('joins number and chosen unit into the text a keyboard would have typed', () => {
    const units = ['mV/div', 'V/div'] as const;
    expect(joinUnit('20', 'mV/div', 'V/div')).toBe('20 mV/div');
    expect(joinUnit('0.5', 'V/div', 'V/div')).toBe('0.5');
    expect(splitTyped('20 mV/div', units, 'V/div')).toEqual({ number: '20', unit: 'mV/div' });
    expect(splitTyped('0.5', units, 'V/div')).toEqual({ number: '0.5', unit: 'V/div' });
  });
});
