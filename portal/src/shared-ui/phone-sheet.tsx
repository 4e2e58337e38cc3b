import Box from '@mui/material/Box';
import { useRef, useState } from 'react';
import { createPortal } from 'react-dom';
import { DrawerPanel, type DrawerPanelProps } from './drawer-panel';
import { token } from './tokens';
import { useEscape } from './use-escape';
import { useFocusBack } from './use-focus-back';
import { useToastsAbove } from './use-toasts-above';
import { BOTTOM_BAR } from './bottom-bar-height';

/** The height of a sheet that leaves the page in sight over it. */
export const HALF_SHEET = '42dvh';

/**
 * A phone's sheet over the lower part of a page that stays in use above it; the grip makes it tall and half high
 * again. For a form that is filled in from the page as well as by typing.
 */
export function PhoneSheet(panel: Omit<DrawerPanelProps, 'grip'>) {
  const root = useRef<HTMLElement>(null);
  const [isTall, setIsTall] = useState(false);
  useEscape(root, panel.onClose);
  useToastsAbove(root);
  useFocusBack(root);
  return createPortal(
    <Box
      component="aside"
      ref={root}
      tabIndex={-1}
      aria-label={panel.title}
      sx={{
        position: 'fixed',
        zIndex: 'appBar',
        insetInline: 0,
        bottom: `calc(${BOTTOM_BAR}px + env(safe-area-inset-bottom))`,
        height: isTall ? 'calc(100dvh - 106px)' : HALF_SHEET,
        borderTop: `1.5px solid ${token('ink')}`,
        borderRadius: '10px 10px 0 0',
        backgroundColor: 'token.sheet',
        overflow: 'hidden',
        transition: 'height 120ms',
        '@media (prefers-reduced-motion: reduce)': { transition: 'none' },
        '&:focus-visible': { outline: 'none' },
      }}
    >
      <DrawerPanel {...panel} grip={{ isTall, onPress: () => setIsTall(!isTall) }} />
    </Box>,
    document.body,
  );
}
