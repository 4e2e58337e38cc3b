import Box from '@mui/material/Box';
import Typography from '@mui/material/Typography';
import type { ReactNode } from 'react';

export interface AnswerCell {
  /** What the figure is: "Return loss in the band". */
  name: string;
  /** The figure: "24.8". Set large. */
  figure: string;
  unit?: string;
  /** What it means, in words. */
  words?: ReactNode;
  /** Beside it: a drawing of a pad. */
  drawing?: ReactNode;
  /** Brass for a caution, with its words; never by colour alone. */
  tone?: 'plain' | 'caution';
  /** Share of the width, 1 unless given. */
  share?: number;
}

interface AnswerLineProps {
  cells: readonly AnswerCell[];
  /** From before what is typed now: in ink3. */
  isStale: boolean;
}

/** The answer in words and figures: the page's one open thing. */
export function AnswerLine({ cells, isStale }: AnswerLineProps) {
  return (
    <Box
      component="section"
      aria-label="Answer"
      sx={{
        display: 'grid',
        gridTemplateColumns: {
          xs: cells.length > 1 ? '1fr 1fr' : '1fr',
          lg: cells.map(({ share = 1 }) => `minmax(0, ${share}fr)`).join(' '),
        },
        border: '1.5px solid',
        borderColor: 'token.ink',
        borderRadius: '3px',
        backgroundColor: 'token.sheet',
        color: isStale ? 'token.ink3' : 'token.ink',
        overflow: 'hidden',
      }}
    >
      {cells.map((cell) => (
        <Cell key={cell.name} {...cell} />
      ))}
    </Box>
  );
}

function Cell({ name, figure, unit, words, drawing, tone = 'plain' }: AnswerCell) {
  return (
    <Box
      sx={{
        display: 'flex',
        flexWrap: 'wrap',
        alignItems: 'center',
        justifyContent: 'space-between',
        gap: '6px 14px',
        p: { xs: '10px 12px', md: '12px 18px' },
        backgroundColor: tone === 'caution' ? 'token.brassTint' : undefined,
        boxShadow: 'inset -1px 0 var(--fr-palette-token-rule), inset 0 -1px var(--fr-palette-token-rule)',
      }}
    >
      <Box sx={{ minWidth: 0 }}>
        <Typography variant="small" component="h2" sx={{ fontWeight: 400, color: 'token.ink2' }}>
          {name}
        </Typography>
        <Box sx={{ display: 'flex', flexWrap: 'wrap', alignItems: 'baseline', gap: '0 6px' }}>
          <Box component="span" sx={{ fontSize: '1.5rem', lineHeight: '32px', fontWeight: 700 }}>
            {figure}
          </Box>
          {unit && (
            <Box component="span" sx={{ fontWeight: 600, color: 'token.ink2' }}>
              {unit}
            </Box>
          )}
        </Box>
        {words && (
          <Typography variant="small" component="div" sx={{ color: 'token.ink2' }}>
            {words}
          </Typography>
        )}
      </Box>
      {drawing}
    </Box>
  );
}
