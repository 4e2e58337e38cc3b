import Box from '@mui/material/Box';
import Typography from '@mui/material/Typography';
import { formatAmount } from '../../../lib/money';
import type { Invoice, MyDues } from '../api/dues';
import { CopyRow } from './copy-row';

interface TransferDetailsProps {
  invoice: Invoice;
  bank: MyDues['bank'];
}

/** Everything the form of the member's own bank asks for. */
export function TransferDetails({ invoice, bank }: TransferDetailsProps) {
  const { openMinor, reference, referencePrinted } = invoice;
  return (
    <Box component="section" aria-label="Or by transfer">
      <Typography variant="h3" sx={{ pt: '12px', pb: '2px' }}>
        Or by transfer
      </Typography>
      {bank.accountName && <CopyRow label="Pay to">{bank.accountName}</CopyRow>}
      {bank.accountNumber && (
        <CopyRow label="Account" copies={bank.accountNumber}>
          {bank.accountNumber}
        </CopyRow>
      )}
      <CopyRow label="Amount" copies={formatAmount(openMinor).replaceAll(',', '')}>
        {formatAmount(openMinor)}
      </CopyRow>
      <CopyRow label="Reference" copies={reference} isMain>
        <Box
          sx={{ fontSize: { xs: '1.0625rem', md: '1.25rem' }, lineHeight: '1.75rem', whiteSpace: 'nowrap' }}
        >
          {referencePrinted}
        </Box>
        <Typography variant="small" component="div" sx={{ color: 'token.ink2' }}>
          With it, your payment finds its invoice by itself.
        </Typography>
      </CopyRow>
    </Box>
  );
}
