import Box from '@mui/material/Box';
import Typography from '@mui/material/Typography';
import type { ReactNode } from 'react';
import { StateMark } from './states/shape';

interface SectionHeadingProps {
  children: ReactNode;
  /** At the right end of the rule: a count in words, a switch, a link. */
  end?: ReactNode;
  /** For `aria-labelledby` of the section it heads. */
  id?: string;
  /** Copper with its pennant. At most one on a screen. */
  needsYou?: boolean;
}

/** A section's heading on its 1.5 px ink rule. */
export function SectionHeading({ children, end, id, needsYou = false }: SectionHeadingProps) {
  return (
    <Box
      sx={{
        display: 'flex',
        alignItems: 'center',
        justifyContent: 'space-between',
        flexWrap: 'wrap',
        gap: '2px 12px',
        minHeight: 34,
        pb: '5px',
        borderBottom: '1.5px solid',
        borderColor: 'token.ink',
      }}
    >
      <Typography
        variant="h2"
        id={id}
        sx={{
          display: 'flex',
          alignItems: 'center',
          gap: '8px',
          color: needsYou ? 'token.copper' : 'token.ink',
        }}
      >
        {needsYou && <StateMark name="pennant" />}
        {children}
      </Typography>
      {end && (
        <Typography variant="small" component="div" sx={{ color: 'token.ink2' }}>
          {end}
        </Typography>
      )}
    </Box>
  );
}
