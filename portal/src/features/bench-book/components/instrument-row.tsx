import Box from '@mui/material/Box';
import Checkbox from '@mui/material/Checkbox';
import { useId } from 'react';
import { Icon } from '../../../shared-ui/icon';
import { token } from '../../../shared-ui/tokens';
import { hintLine } from '../../../shared-ui/fields/hint-line';
import type { Instrument } from '../api/bench-book';
import type { InstrumentWords } from '../form/instrument-words';

interface InstrumentRowProps {
  instrument: Instrument;
  words: InstrumentWords;
  error: string | undefined;
  checked: boolean;
  onChange: (checked: boolean) => void;
}

/** One instrument of the form: dashed and not to be ticked when it may not be used, with the reason in the row. */
export function InstrumentRow({ instrument, words, error, checked, onChange }: InstrumentRowProps) {
  const id = useId();
  const isOpen = instrument.mayBook || checked;
  return (
    <Box
      component="label"
      sx={{
        display: 'grid',
        gridTemplateColumns: '32px 1fr auto',
        alignItems: 'start',
        py: '7px',
        borderBottom: '1px solid',
        borderColor: 'token.rule',
        cursor: isOpen ? 'pointer' : 'default',
      }}
    >
      <Checkbox
        checked={checked}
        disabled={!isOpen}
        onChange={(_event, next) => onChange(next)}
        icon={<TickBox />}
        checkedIcon={<TickBox isTicked />}
        slotProps={{ input: { 'aria-describedby': id } }}
        sx={{ p: '12px', m: '-10px 0 -12px -13px' }}
      />
      <Box component="span" sx={{ color: isOpen ? 'token.ink' : 'token.ink3' }}>
        <b>{instrument.tag}</b> {instrument.name}
      </Box>
      <Box component="span" sx={{ typography: 'small', color: 'token.ink2' }}>
        {words.end}
      </Box>
      <Box
        component="span"
        id={id}
        sx={{
          gridColumn: '2 / -1',
          typography: 'small',
          color: error ? 'token.oxide' : words.tone === 'brass' ? 'token.brass' : 'token.ink2',
        }}
      >
        {hintLine(error, words.line)}
      </Box>
    </Box>
  );
}

function TickBox({ isTicked = false }: { isTicked?: boolean }) {
  return (
    <Box
      component="span"
      sx={{
        display: 'grid',
        placeItems: 'center',
        width: 18,
        height: 18,
        border: '1px solid',
        borderColor: isTicked ? 'token.green' : 'token.edge',
        borderRadius: '2px',
        color: token('onGreen'),
        backgroundColor: isTicked ? 'token.green' : 'token.sheet',
        '.Mui-disabled > &': { borderStyle: 'dashed', backgroundColor: 'transparent' },
      }}
    >
      {isTicked && <Icon name="check" size={14} />}
    </Box>
  );
}
