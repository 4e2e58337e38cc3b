import Box from '@mui/material/Box';
import { useCallback, useRef, useState } from 'react';
import { Outlet, ScrollRestoration } from 'react-router-dom';
import { DrawerSlot } from '../../shared-ui/drawer-slot';
import { PhoneBarSlot } from '../../shared-ui/phone-bar';
import { BottomBar } from './bottom-bar';
import { KeyList } from './key-list';
import { MoreSheet } from './more-sheet';
import { PhoneHeader } from './phone-header';
import { Rail } from './rail';
import { SkipLink } from './skip-link';
import { useFocusOnArrival } from './use-focus-on-arrival';
import { useFrameKeys } from './use-frame-keys';

/** What stands around every page: rail or bottom bar, the page itself, and the place where drawers dock. */
export function PageFrame() {
  const [bar, setBar] = useState<HTMLElement | null>(null);
  const [drawer, setDrawer] = useState<HTMLElement | null>(null);
  const [isMoreOpen, setIsMoreOpen] = useState(false);
  const [areKeysOpen, setAreKeysOpen] = useState(false);
  const showKeys = useCallback(() => setAreKeysOpen(true), []);
  const main = useRef<HTMLElement>(null);
  useFrameKeys(showKeys);
  useFocusOnArrival(main);
  return (
    <PhoneBarSlot value={bar}>
      <DrawerSlot value={drawer}>
        <SkipLink />
        <Box sx={{ display: { md: 'flex' }, minHeight: '100dvh' }}>
          <Rail onKeys={showKeys} />
          <PhoneHeader slotRef={setBar} />
          <Box
            component="main"
            id="main"
            ref={main}
            tabIndex={-1}
            sx={{
              flex: '1 1 0',
              minWidth: 0,
              maxWidth: 1680,
              p: { xs: '12px 16px 90px', md: '24px 32px 40px 34px' },
              '&:focus-visible': { outline: 'none' },
              '@media print': { p: 0 },
            }}
          >
            <Outlet />
          </Box>
          <Box ref={setDrawer} sx={{ display: 'flex' }} />
        </Box>
        <MoreSheet open={isMoreOpen} onClose={() => setIsMoreOpen(false)} />
        <BottomBar isMoreOpen={isMoreOpen} onMore={() => setIsMoreOpen(!isMoreOpen)} />
        <KeyList open={areKeysOpen} onClose={() => setAreKeysOpen(false)} />
        <ScrollRestoration />
      </DrawerSlot>
    </PhoneBarSlot>
  );
}
