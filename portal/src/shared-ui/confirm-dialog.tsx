import Button from '@mui/material/Button';
import Dialog from '@mui/material/Dialog';
import DialogActions from '@mui/material/DialogActions';
import DialogContent from '@mui/material/DialogContent';
import DialogTitle from '@mui/material/DialogTitle';
import { useId, type ReactNode } from 'react';

interface ConfirmDialogProps {
  open: boolean;
  /** The act: "Put FR-031 out of use?" */
  title: string;
  /** Counts who is affected; may hold a field. */
  children: ReactNode;
  /** The verb again: "Put out of use". */
  act: string;
  /** What stays as it is: "Leave it in use". */
  stay: string;
  /** Red edge, for what cannot be taken back. */
  grave?: boolean;
  isBusy?: boolean;
  onAct: () => void;
  onStay: () => void;
}

/** Asks only when others are affected or the act cannot be taken back. */
export function ConfirmDialog({
  open,
  title,
  children,
  act,
  stay,
  grave,
  isBusy,
  onAct,
  onStay,
}: ConfirmDialogProps) {
  const id = useId();
  return (
    <Dialog open={open} onClose={onStay} aria-labelledby={id} maxWidth="xs" fullWidth>
      <DialogTitle id={id}>{title}</DialogTitle>
      <DialogContent>{children}</DialogContent>
      <DialogActions>
        <Button
          variant={grave ? 'outlined' : 'contained'}
          color={grave ? 'error' : 'primary'}
          loading={isBusy}
          onClick={onAct}
        >
          {act}
        </Button>
        <Button onClick={onStay}>{stay}</Button>
      </DialogActions>
    </Dialog>
  );
}
