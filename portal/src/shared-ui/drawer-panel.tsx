import Box from '@mui/material/Box';
import IconButton from '@mui/material/IconButton';
import Typography from '@mui/material/Typography';
import type { ReactNode } from 'react';
import { Icon } from './icon';

export interface DrawerPanelProps {
  /** Its name, also for a screen reader. */
  title: string;
  /** In place of the title's text: a tag and a state over a name. */
  head?: ReactNode;
  children: ReactNode;
  /** The action bar on sunk, always in sight. */
  footer?: ReactNode;
  onClose: () => void;
  grip?: boolean;
}

/** What is inside a drawer: head with Close, a body that scrolls, the action bar. */
export function DrawerPanel({ title, head, children, footer, onClose, grip = false }: DrawerPanelProps) {
  return (
    <Box sx={{ display: 'flex', flexDirection: 'column', height: '100%', minHeight: 0, overflow: 'hidden' }}>
      {grip && (
        <Box
          sx={{
            flex: 'none',
            width: 40,
            height: 4,
            m: '9px auto 2px',
            borderRadius: 2,
            backgroundColor: 'token.edge',
          }}
        />
      )}
      <Box
        sx={{ flex: 'none', display: 'flex', alignItems: 'flex-start', gap: '8px', p: '16px 12px 4px 24px' }}
      >
        <Box sx={{ flex: 1, minWidth: 0, pt: '9px' }}>
          {head ?? (
            <Typography variant="h2" sx={{ fontSize: '1.1875rem', lineHeight: '1.5rem' }}>
              {title}
            </Typography>
          )}
        </Box>
        <IconButton onClick={onClose} aria-label={`Close ${title}`}>
          <Icon name="close" size={18} />
        </IconButton>
      </Box>
      <Box sx={{ flex: 1, minHeight: 0, overflowY: 'auto', p: '4px 24px 20px' }}>{children}</Box>
      {footer && (
        <Box
          sx={{
            flex: 'none',
            p: '14px 24px 16px',
            borderTop: '1px solid',
            borderColor: 'token.rule',
            backgroundColor: 'token.sunk',
          }}
        >
          {footer}
        </Box>
      )}
    </Box>
  );
}
