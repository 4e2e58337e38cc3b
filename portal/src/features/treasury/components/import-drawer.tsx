import Box from '@mui/material/Box';
import Button from '@mui/material/Button';
import Typography from '@mui/material/Typography';
import { useRef } from 'react';
import { useNavigate } from 'react-router-dom';
import { carryOut } from '../../../api-client/carry-out';
import { counted } from '../../../lib/text';
import { DockedDrawer } from '../../../shared-ui/docked-drawer';
import { ProblemAlert } from '../../../shared-ui/problem-alert';
import { useToast } from '../../../shared-ui/toasts';
import { useImportStatement } from '../api/treasury';

/** Chooses a statement's file, sends it, and leads to what came of it. */
export function ImportDrawer({ open, onClose }: { open: boolean; onClose: () => void }) {
  const picker = useRef<HTMLInputElement>(null);
  const sending = useImportStatement();
  const navigate = useNavigate();
  const say = useToast();
  const send = (file: File) =>
    carryOut(sending, file, {
      onSuccess: ({ id, lineCount, matchedCount }) => {
        say(`Statement imported, ${matchedCount} of ${counted(lineCount, 'line')} matched by itself.`);
        onClose();
        void navigate(`/treasury/reconcile/${id}`);
      },
    });
  return (
    <DockedDrawer open={open} title="Import a statement" onClose={onClose}>
      <Typography component="p">
        Save the current account’s statement as a CSV file and choose it here. A line that was imported before
        is not counted again. If a line is wrong, nothing is kept, and the line is named.
      </Typography>
      <input
        ref={picker}
        type="file"
        accept=".csv,text/csv"
        aria-label="Statement file"
        hidden
        onChange={(event) => {
          const [file] = event.target.files ?? [];
          // The same file may be chosen again once it is put right.
          event.target.value = '';
          if (file) send(file);
        }}
      />
      <Button
        variant="contained"
        fullWidth
        loading={sending.isPending}
        onClick={() => picker.current?.click()}
      >
        Choose the file
      </Button>
      {sending.isPending && (
        <Typography component="p" role="status">
          Reading {sending.variables.name}
        </Typography>
      )}
      {sending.isError && (
        <Box sx={{ mt: '14px' }}>
          <ProblemAlert error={sending.error} />
        </Box>
      )}
      <Typography variant="h3" sx={{ mt: '22px' }}>
        The file’s form
      </Typography>
      <Box
        component="pre"
        sx={{
          overflowX: 'auto',
          p: '10px',
          border: '1px solid',
          borderColor: 'token.rule',
          fontSize: '0.75rem',
        }}
      >
        {
          'date,description,amount,balance\n2026-09-01,Standing order,24.00,3436.86\n2026-09-03,Electricity,-86.40,3350.46'
        }
      </Box>
      <Typography variant="small" component="p" sx={{ color: 'token.ink2' }}>
        The heading names the columns, in any order. Money out is negative, the balance is the account’s after
        the line, and lines stand oldest or newest first.
      </Typography>
    </DockedDrawer>
  );
}
