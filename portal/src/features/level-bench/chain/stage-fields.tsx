import Box from '@mui/material/Box';
import Button from '@mui/material/Button';
import { useState } from 'react';
import { QuantityField } from '../../../shared-ui/fields/quantity-field';
import { TextField } from '../../../shared-ui/fields/text-field';
import { COLUMNS, type StageTexts } from './stages';

interface StageFieldsProps {
  stage: StageTexts;
  problemOf: (field: string) => string | undefined;
  onType: (field: keyof StageTexts, text: string) => void;
  onUp?: () => void;
  onDown?: () => void;
  onRemove?: () => void;
}

const HINTS: Partial<Record<string, string>> = { noiseFigureDb: 'Empty: its loss' };

const BUTTONS = {
  gridColumn: '1 / -1',
  display: 'grid',
  gridTemplateColumns: 'repeat(3, minmax(0, 1fr))',
  gap: '8px',
  '& button': { minWidth: 0, px: '4px' },
} as const;

/** The open stage: what is known of it, and where it stands. */
export function StageFields({ stage, problemOf, onType, onUp, onDown, onRemove }: StageFieldsProps) {
  const [typing, setTyping] = useState<string>();
  return (
    <Box
      sx={{
        display: 'grid',
        gridTemplateColumns: 'repeat(2, minmax(0, 1fr))',
        alignItems: 'start',
        gap: '10px',
        p: '4px 10px 10px',
      }}
    >
      <Box sx={{ gridColumn: '1 / -1' }}>
        <TextField label="Name" value={stage.name} onChange={(text) => onType('name', text)} maxLength={30} />
      </Box>
      {COLUMNS.map(({ name, label, unit }) => (
        <QuantityField
          key={name}
          label={label}
          unit={unit}
          value={stage[name]}
          hint={stage[name] === '' ? HINTS[name] : undefined}
          error={typing === name ? undefined : problemOf(name)}
          onBlur={() => setTyping(undefined)}
          onChange={(text) => {
            setTyping(name);
            onType(name, text);
          }}
        />
      ))}
      <Box sx={BUTTONS}>
        <Button aria-label="Move up" disabled={!onUp} onClick={onUp}>
          Up
        </Button>
        <Button aria-label="Move down" disabled={!onDown} onClick={onDown}>
          Down
        </Button>
        <Button disabled={!onRemove} onClick={onRemove}>
          Remove
        </Button>
      </Box>
    </Box>
  );
}
