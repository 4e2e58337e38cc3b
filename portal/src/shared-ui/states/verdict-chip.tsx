import Box from '@mui/material/Box';

import { StateMark } from './shape';
import type { Verdict } from './state-words';
import { VERDICTS } from './state-words';
import { VisuallyHidden } from '../visually-hidden';

interface VerdictChipProps {
  verdict: Verdict;
  /** "Too close" in a narrow place; read aloud in full. */
  narrow?: boolean;
  /** Of the last good result, while what is typed cannot be read. */
  isStale?: boolean;
}

export function VerdictChip({ verdict, narrow = false, isStale = false }: VerdictChipProps) {
  const { shape, words, short, ...own } = VERDICTS[verdict];
  const { colour, tint } = isStale ? ({ colour: 'ink3', tint: 'sheet' } as const) : own;
  return (
    <Box
      component="span"
      sx={{
        display: 'inline-flex',
        alignItems: 'center',
        gap: '6px',
        height: 24,
        px: '8px',
        borderRadius: '3px',
        border: '1px solid',
        borderColor: `token.${colour}`,
        color: `token.${colour}`,
        backgroundColor: `token.${tint}`,
        fontWeight: 600,
        fontSize: '0.78125rem',
        whiteSpace: 'nowrap',
      }}
    >
      <StateMark name={shape} size={14} />
      <span aria-hidden={narrow || undefined}>{narrow ? short : words}</span>
      {narrow && <VisuallyHidden>{words}</VisuallyHidden>}
    </Box>
  );
}
