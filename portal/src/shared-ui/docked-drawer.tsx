import Box from '@mui/material/Box';
import Drawer from '@mui/material/Drawer';
import { useRef, type ReactNode } from 'react';
import { createPortal } from 'react-dom';
import type { DrawerPanelProps } from './drawer-panel';
import { DrawerPanel } from './drawer-panel';
import { useDrawerSlot } from './drawer-slot';
import { PhoneSheet } from './phone-sheet';
import { token } from './tokens';
import { useEscape } from './use-escape';
import { useFocusBack } from './use-focus-back';
import { useNarrow, usePhone } from './use-phone';

interface DockedDrawerProps extends Omit<DrawerPanelProps, 'grip'> {
  open: boolean;
  /** 362 unless the content wants more, at most 452. */
  width?: number;
  /** On a phone: over the page, or beside it, half high, so that the page can be used meanwhile. */
  phone?: 'over' | 'beside';
}

/**
 * A form or one opened thing beside its list: docked and pushing on a wide screen, over the page's right edge on a
 * tablet, a bottom sheet with a grip on a phone. Escape closes it; focus goes back to what opened it. It closes
 * without asking, so forms inside keep a draft.
 */
export function DockedDrawer({ open, width = 362, phone = 'over', ...panel }: DockedDrawerProps) {
  const slot = useDrawerSlot();
  const isPhone = usePhone();
  const isNarrow = useNarrow();
  if (!isNarrow) return open ? dock(<Docked width={width} {...panel} />, slot) : null;
  if (isPhone && phone === 'beside') return open && <PhoneSheet {...panel} />;
  return (
    <Drawer
      open={open}
      onClose={panel.onClose}
      anchor={isPhone ? 'bottom' : 'right'}
      slotProps={{
        paper: {
          sx: isPhone
            ? {
                // The bottom bar stays in sight under the sheet.
                bottom: 62,
                maxHeight: 'calc(100dvh - 106px)',
                borderTop: `1.5px solid ${token('ink')}`,
                borderRadius: '10px 10px 0 0',
              }
            : { width: Math.max(width, 400), borderLeft: `1.5px solid ${token('ink')}` },
          'aria-label': panel.title,
        },
      }}
    >
      <DrawerPanel {...panel} grip={isPhone ? 'drawn' : undefined} />
    </Drawer>
  );
}

const dock = (drawer: ReactNode, slot: HTMLElement | null) => (slot ? createPortal(drawer, slot) : drawer);

function Docked({ width, ...panel }: DrawerPanelProps & { width: number }) {
  const root = useRef<HTMLElement>(null);
  useEscape(root, panel.onClose);
  useFocusBack(root);
  return (
    <Box
      component="aside"
      ref={root}
      tabIndex={-1}
      aria-label={panel.title}
      sx={{
        position: 'sticky',
        top: 0,
        width,
        height: '100dvh',
        flex: 'none',
        borderLeft: '1.5px solid',
        borderColor: 'token.ink',
        backgroundColor: 'token.sheet',
        '&:focus-visible': { outline: 'none' },
      }}
    >
      <DrawerPanel {...panel} />
    </Box>
  );
}
