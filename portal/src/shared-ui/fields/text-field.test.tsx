import { render, screen } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import { useState } from 'react';
import { describe, expect, it } from 'vitest';
import { TextField } from './text-field';

function Note() {
  const [text, setText] = useState('');
  return <TextField label="Note" value={text} onChange={setText} maxLength={10} hint="For everybody" />;
}

describe('a field for so many characters', () => {
  it('cuts nothing off, and says how much has to go', async () => {
    render(<Note />);
    const field = screen.getByLabelText('Note');
    await userEvent.type(field, 'twelve marks');
    expect(field).toHaveValue('twelve marks');
    expect(field).toBeInvalid();
    expect(field).toHaveAccessibleDescription('2 characters too long: at most 10 characters.');
  });

  it('counts what is left once it is nearly full, and keeps its hint before', async () => {
    render(<Note />);
    const field = screen.getByLabelText('Note');
    await userEvent.type(field, 'short');
    expect(field).toHaveAccessibleDescription('For everybody');
    await userEvent.type(field, 'word');
    expect(field).toHaveAccessibleDescription('1 character left');
    expect(field).toBeValid();
  });
});
