import Box from '@mui/material/Box';
import ButtonBase from '@mui/material/ButtonBase';
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
  /** At the top of a phone's sheet: only drawn, or a button that makes the sheet tall. */
  grip?: 'drawn' | GripButtonProps;
}

interface GripButtonProps {
  isTall: boolean;
  onPress: () => void;
}

/** What is inside a drawer: head with Close, a body that scrolls, the action bar. */
export function DrawerPanel({ title, head, children, footer, onClose, grip }: DrawerPanelProps) {
  return (
    <Box sx={{ display: 'flex', flexDirection: 'column', height: '100%', minHeight: 0, overflow: 'hidden' }}>
      {grip === 'drawn' ? <Grip /> : grip && <GripButton {...grip} />}
      <Box
        sx={{
          flex: 'none',
          display: 'flex',
          alignItems: 'flex-start',
          gap: '8px',
          p: grip ? '4px 8px 0 16px' : '16px 12px 4px 24px',
        }}
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
      <Box sx={{ flex: 1, minHeight: 0, overflowY: 'auto', p: grip ? '4px 16px 16px' : '4px 24px 20px' }}>
        {children}
      </Box>
      {footer && (
        <Box
          sx={{
            flex: 'none',
            p: grip ? '10px 16px 12px' : '14px 24px 16px',
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

function Grip() {
  return (
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
  );
}

/** 44 wide and high to the finger; the head below gives up what it takes. */
function GripButton({ isTall, onPress }: GripButtonProps) {
  return (
    <ButtonBase
      aria-label={isTall ? 'Half high' : 'Full height'}
      onClick={onPress}
      sx={{ flex: 'none', alignItems: 'flex-start', width: 120, height: 44, m: '0 auto -28px', zIndex: 1 }}
    >
      <Grip />
    </ButtonBase>
  );
}
