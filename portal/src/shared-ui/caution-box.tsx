import Box from '@mui/material/Box';
import type { ReactNode } from 'react';
import type { CautionKind } from './caution-symbols';
import { CAUTION_SYMBOLS } from './caution-symbols';

const NAMES: Record<CautionKind, string> = {
  'load before power': 'Load before power.',
  'hot parts': 'Hot parts.',
  'RF power': 'RF power.',
  'mains and high voltage': 'Mains and high voltage.',
  'RF exposure': 'RF exposure.',
  'licence needed': 'Licence needed.',
};

const BRASS: readonly CautionKind[] = ['load before power', 'hot parts'];

interface CautionBoxProps {
  kind: CautionKind;
  /** In place of the caution's own name, still first and bold: "RF power on Bench 4 from 20:30." */
  name?: string;
  /** What to do. */
  children: ReactNode;
  /** The tick an oxide caution asks for before Keep, under the text. */
  tick?: ReactNode;
}

/** Stands directly beside the act it warns of, and cannot be dismissed while it applies. */
export function CautionBox({ kind, name = NAMES[kind], children, tick }: CautionBoxProps) {
  const colour = BRASS.includes(kind) ? 'brass' : 'oxide';
  return (
    <Box
      role="note"
      aria-label={`Caution: ${name}`}
      sx={{
        display: 'grid',
        gridTemplateColumns: '34px 1fr',
        border: '1px solid',
        borderColor: `token.${colour}`,
        borderRadius: '3px',
        backgroundColor: `token.${colour}Tint`,
        breakInside: 'avoid',
      }}
    >
      <Box
        aria-hidden
        sx={{
          display: 'grid',
          placeItems: 'center',
          color: `token.${colour}`,
          borderRight: '1px solid',
          borderColor: `token.${colour}`,
        }}
      >
        <svg
          width="20"
          height="20"
          viewBox="0 0 24 24"
          fill="none"
          stroke="currentColor"
          strokeWidth="1.8"
          strokeLinecap="round"
          strokeLinejoin="round"
        >
          {CAUTION_SYMBOLS[kind]}
        </svg>
      </Box>
      <Box sx={{ px: '11px', py: '7px', fontSize: '0.78125rem', lineHeight: '1.125rem', color: 'token.ink' }}>
        <b>{name}</b> {children}
        {tick}
      </Box>
    </Box>
  );
}
