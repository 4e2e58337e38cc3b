import Box from '@mui/material/Box';
import Typography from '@mui/material/Typography';
import { useState, type ReactNode } from 'react';
import Button from '@mui/material/Button';

interface AssumedFiguresProps {
  /** Name and figure with its ±: `['Conversion loss', '6.5 ± 1 dB']`. */
  figures: readonly (readonly [name: string, figure: string])[];
  /** Where they come from: "Class figures, common practice." */
  source: string;
  /** One of them cannot be used as it is: its field is shown with what is wrong. */
  hasProblem?: boolean;
  /** The fields to type one's own, shown on Change. */
  children?: ReactNode;
}

/** Figures nobody typed, listed so that nobody is fooled by them; they can be typed over. */
export function AssumedFigures({ figures, source, hasProblem = false, children }: AssumedFiguresProps) {
  const [isAsked, setIsAsked] = useState(false);
  const isOpen = isAsked || hasProblem;
  return (
    <Box component="section" aria-label="Figures assumed" sx={{ mb: '18px' }}>
      <Typography
        variant="h3"
        component="h2"
        sx={{ pb: '4px', borderBottom: '1px solid', borderColor: 'token.ink' }}
      >
        Figures assumed
      </Typography>
      <Box component="dl" sx={{ m: 0 }}>
        {figures.map(([name, figure]) => (
          <Box
            key={name}
            sx={{
              display: 'flex',
              justifyContent: 'space-between',
              gap: '12px',
              py: '3px',
              borderBottom: '1px solid',
              borderColor: 'token.rule',
              typography: 'small',
            }}
          >
            <Box component="dt" sx={{ color: 'token.ink2' }}>
              {name}
            </Box>
            <Box component="dd" sx={{ m: 0, fontWeight: 700, textAlign: 'right' }}>
              {figure}
            </Box>
          </Box>
        ))}
      </Box>
      <Typography variant="small" component="p" sx={{ m: 0, mt: '6px', color: 'token.ink3' }}>
        {source} {children && 'Type your own when you have measured them. '}
        {children && (
          <Button
            size="small"
            variant="text"
            sx={{ minHeight: 0, p: 0, verticalAlign: 'baseline', textDecoration: 'underline' }}
            aria-expanded={isOpen}
            onClick={() => setIsAsked(!isOpen)}
          >
            {isOpen ? 'Close' : 'Change'}
          </Button>
        )}
      </Typography>
      {isOpen && (
        <Box
          sx={{ display: 'grid', gridTemplateColumns: 'repeat(2, minmax(0, 1fr))', gap: '10px', mt: '10px' }}
        >
          {children}
        </Box>
      )}
    </Box>
  );
}
