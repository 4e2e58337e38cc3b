import Box from '@mui/material/Box';
import type { ReactNode } from 'react';
import type { TokenName } from '../tokens';
import type { ShapeName } from './shape';
import { StateMark } from './shape';
import type { InstrumentState, StageState, Verdict } from './state-words';
import { INSTRUMENT_STATES, STAGE_STATES, VERDICTS } from './state-words';

interface StateLineProps {
  shape: ShapeName;
  colour: TokenName;
  children: ReactNode;
}

/** Shape, then word, then colour: any one of the three is enough to read the state. */
export function StateLine({ shape, colour, children }: StateLineProps) {
  return (
    <Box
      component="span"
      sx={{
        display: 'inline-flex',
        // In the middle of its row, not on the mark's foot.
        verticalAlign: 'middle',
        alignItems: 'center',
        gap: '6px',
        color: `token.${colour}`,
        fontWeight: 600,
        fontSize: '0.78125rem',
        lineHeight: '1.125rem',
      }}
    >
      <StateMark name={shape} size={14} />
      {children}
    </Box>
  );
}

/** A stage's state in shape and words; `children` replaces the words ("On the bench, 23 days"). */
export function StageStateLine({ state, children }: { state: StageState; children?: ReactNode }) {
  const { shape, colour, words } = STAGE_STATES[state];
  return <StateLine {...{ shape, colour }}>{children ?? words}</StateLine>;
}

export function InstrumentStateLine({ state, children }: { state: InstrumentState; children?: ReactNode }) {
  const { shape, colour, words } = INSTRUMENT_STATES[state];
  return <StateLine {...{ shape, colour }}>{children ?? words}</StateLine>;
}

/** A verdict without its box, for rows of a list. */
export function VerdictLine({ verdict, children }: { verdict: Verdict; children?: ReactNode }) {
  const { shape, colour, words } = VERDICTS[verdict];
  return <StateLine {...{ shape, colour }}>{children ?? words}</StateLine>;
}
