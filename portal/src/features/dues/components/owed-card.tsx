import Box from '@mui/material/Box';
import Button from '@mui/material/Button';
import Typography from '@mui/material/Typography';
import { formatMoney } from '../../../lib/money';
import { Icon } from '../../../shared-ui/icon';
import { ProblemAlert } from '../../../shared-ui/problem-alert';
import { useCheckout, type Invoice, type MyDues } from '../api/dues';
import { dueText, lateText, type Standing } from '../standing';
import { InvoiceChoice } from './invoice-choice';
import { TransferDetails } from './transfer-details';

interface OwedCardProps {
  standing: Standing;
  /** The invoice the card is open on. */
  invoice: Invoice;
  dues: MyDues;
  onChoose: (invoiceId: string) => void;
}

function headOf({ owed, owedMinor }: Standing, invoice: Invoice): { label: string; amountMinor: number } {
  if (!owed.some(({ id }) => id === invoice.id))
    return { label: 'Coming up', amountMinor: invoice.openMinor };
  const latest = Math.max(...owed.map(({ daysLate }) => daysLate));
  return { label: latest > 0 ? `Owed, ${lateText(latest)}` : 'Owed now', amountMinor: owedMinor };
}

/** The sum owed, the card button, and the values of a transfer. */
export function OwedCard({ standing, invoice, dues, onChoose }: OwedCardProps) {
  const checkout = useCheckout();
  const { label, amountMinor } = headOf(standing, invoice);
  const choices = standing.owed.some(({ id }) => id === invoice.id) ? standing.owed : [invoice];
  return (
    <Box
      component="section"
      aria-label={label}
      sx={{
        border: '1.5px solid',
        borderColor: 'token.ink',
        borderRadius: '3px',
        backgroundColor: 'token.sheet',
        p: { xs: '14px 16px 12px', md: '16px 20px 14px' },
      }}
    >
      <Box sx={{ display: 'flex', flexWrap: 'wrap', gap: '12px 24px', alignItems: 'center' }}>
        <Box sx={{ flex: '1 1 260px', minWidth: 0 }}>
          <Typography variant="small" component="div" sx={{ color: 'token.ink2' }}>
            {label}
          </Typography>
          <Typography variant="reading" component="div">
            {formatMoney(amountMinor, dues.currency)}
          </Typography>
          <Typography variant="small" component="div" sx={{ color: 'token.ink2' }}>
            {invoice.description}. {dueText(invoice)}
          </Typography>
        </Box>
        <Button
          variant="contained"
          loading={checkout.isPending || checkout.isSuccess}
          onClick={() => checkout.mutate(invoice.id)}
          endIcon={<Icon name="arrow" size={18} />}
          sx={{ minHeight: 48, flex: { xs: '1 1 100%', md: '0 0 auto' } }}
        >
          Pay {formatMoney(invoice.openMinor, dues.currency)} by card
        </Button>
      </Box>
      {checkout.isError && (
        <Box sx={{ mt: '10px' }}>
          <ProblemAlert error={checkout.error} onRetry={() => checkout.mutate(invoice.id)} />
        </Box>
      )}
      {choices.length > 1 && <InvoiceChoice invoices={choices} chosenId={invoice.id} onChoose={onChoose} />}
      <Box sx={{ mt: '14px', borderTop: '1px solid', borderColor: 'token.rule' }}>
        <TransferDetails invoice={invoice} bank={dues.bank} />
      </Box>
      {dues.treasurerName && (
        <Typography variant="small" component="p" sx={{ m: 0, pt: '12px', color: 'token.ink2' }}>
          Cash or a cheque: hand it to {dues.treasurerName} on a build night. The receipt comes by mail.
        </Typography>
      )}
    </Box>
  );
}
