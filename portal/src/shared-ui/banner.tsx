import Box from '@mui/material/Box';
import type { ReactNode } from 'react';
import { Icon } from './icon';
import { StateMark } from './states/shape';

type BannerKind = 'no connection' | 'failed' | 'not allowed' | 'needs you';

const LOOKS = {
  'no connection': { border: 'edge', colour: 'brass', mark: <Icon name="noConnection" size={18} /> },
  failed: { border: 'oxide', colour: 'oxide', mark: <StateMark name="octagon" size={17} /> },
  'not allowed': { border: 'edge', colour: 'ink2', mark: <Icon name="lock" size={17} /> },
  'needs you': { border: 'copper', colour: 'copper', mark: <StateMark name="pennant" size={17} /> },
} as const;

interface BannerProps {
  kind: BannerKind;
  /** The bold first sentence, with its full stop. */
  title: string;
  children?: ReactNode;
  /** A button or link under the text. */
  action?: ReactNode;
}

/** Says in place of the content, or over it, what happened, what was kept and what to do. */
export function Banner({ kind, title, children, action }: BannerProps) {
  const { border, colour, mark } = LOOKS[kind];
  return (
    <Box
      role={kind === 'failed' ? 'alert' : 'status'}
      sx={{
        display: 'grid',
        gridTemplateColumns: '20px 1fr',
        gap: '10px',
        p: '9px 14px 10px 11px',
        border: '1px solid',
        borderColor: `token.${border}`,
        borderRadius: '3px',
        backgroundColor: 'token.sheet',
        fontSize: '0.78125rem',
        lineHeight: '1.125rem',
      }}
    >
      <Box component="span" sx={{ color: `token.${colour}`, pt: '1px' }}>
        {mark}
      </Box>
      <div>
        <b>{title}</b> {children}
        {action && <Box sx={{ mt: '8px' }}>{action}</Box>}
      </div>
    </Box>
  );
}
