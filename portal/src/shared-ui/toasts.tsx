import Box from '@mui/material/Box';
import Button from '@mui/material/Button';
import Snackbar from '@mui/material/Snackbar';
import { createContext, useCallback, useContext, useState, type ReactNode } from 'react';
import { TOAST_LIFT } from './use-toasts-above';

interface Toast {
  id: number;
  words: string;
  undo?: () => void;
}

type Say = (words: string, undo?: () => void) => void;

const SHOWN_MS = 8000;
/** Never so far that a toast leaves the window over a tall sheet. */
const LIFT = `min(var(${TOAST_LIFT}, 0px), 100dvh - 180px)`;
const Saying = createContext<Say>(() => undefined);

/**
 * Says afterwards what was done, with Undo where there is one. Never the only place an error appears.
 * @example const say = useToast(); say('Reading kept, +0.50 ± 0.39 dBm.', () => takeBack(id));
 */
export const useToast = (): Say => useContext(Saying);

export function ToastProvider({ children }: { children: ReactNode }) {
  const [toast, setToast] = useState<Toast>();
  const say = useCallback<Say>(
    (words, undo) => setToast({ id: Date.now() + Math.random(), words, undo }),
    [],
  );
  const close = () => setToast(undefined);
  const undo = () => {
    toast?.undo?.();
    close();
  };
  return (
    <Saying.Provider value={say}>
      {children}
      <Snackbar
        key={toast?.id}
        open={toast !== undefined}
        autoHideDuration={SHOWN_MS}
        onClose={(_event, reason) => reason !== 'clickaway' && close()}
        anchorOrigin={{ vertical: 'bottom', horizontal: 'left' }}
        sx={{
          left: { xs: 16, md: 252 },
          right: { xs: 16, md: 'auto' },
          bottom: { xs: `calc(76px + ${LIFT})`, md: `calc(24px + ${LIFT})` },
        }}
      >
        <Box
          role="status"
          sx={{
            display: 'flex',
            alignItems: 'center',
            justifyContent: 'space-between',
            gap: '24px',
            width: '100%',
            minWidth: { md: 340 },
            minHeight: 44,
            pl: '16px',
            pr: '8px',
            borderRadius: '3px',
            backgroundColor: 'token.ink',
            color: 'token.paper',
          }}
        >
          {toast?.words}
          {toast?.undo && (
            <Button
              variant="text"
              onClick={undo}
              sx={{ '&, &:hover': { color: 'inherit', textDecoration: 'underline' } }}
            >
              Undo
            </Button>
          )}
        </Box>
      </Snackbar>
    </Saying.Provider>
  );
}
