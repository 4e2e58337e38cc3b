import Box from '@mui/material/Box';
import Typography from '@mui/material/Typography';
import { useQuery } from '@tanstack/react-query';
import { useController, type Control, type UseFormSetValue } from 'react-hook-form';
import { dayText } from '../../../lib/club-time-text';
import { formatAmount } from '../../../lib/money';
import { CheckField } from '../../../shared-ui/fields/check-field';
import { LoadingBars } from '../../../shared-ui/loading-bars';
import { ProblemAlert } from '../../../shared-ui/problem-alert';
import { openOfPersonQuery } from '../api/treasury';
import type { PaymentFields } from '../payment-fields';

interface InvoiceTicksProps {
  control: Control<PaymentFields>;
  setValue: UseFormSetValue<PaymentFields>;
  personId: string;
}

/** The person's open invoices; ticking them writes their sum into the amount. */
export function InvoiceTicks({ control, setValue, personId }: InvoiceTicksProps) {
  const query = useQuery(openOfPersonQuery(personId));
  const { field } = useController({ control, name: 'invoiceIds' });
  if (query.isPending) return <LoadingBars rows={2} label="Loading what is open" />;
  if (query.isError) return <ProblemAlert error={query.error} onRetry={() => void query.refetch()} />;
  const { items } = query.data;
  const ticked = items.filter(({ id }) => field.value.includes(id));
  const tick = (invoiceId: string, isTicked: boolean) => {
    const next = isTicked
      ? [...ticked.map(({ id }) => id), invoiceId]
      : ticked.map(({ id }) => id).filter((id) => id !== invoiceId);
    const sum = items
      .filter(({ id }) => next.includes(id))
      .reduce((total, { openMinor }) => total + openMinor, 0);
    field.onChange(next);
    setValue('amount', sum > 0 ? formatAmount(sum) : '', { shouldValidate: false });
  };
  if (items.length === 0)
    return (
      <Typography variant="small">
        Nothing is open. The payment becomes credit for the next invoice.
      </Typography>
    );
  return (
    <Box component="fieldset" sx={{ m: 0, p: 0, border: 0, minWidth: 0 }}>
      <Box component="legend" sx={{ p: 0, typography: 'label', color: 'token.ink2' }}>
        For
      </Box>
      {items.map(({ id, number, description, openMinor, dueOn }) => (
        <CheckField
          key={id}
          label={`${number}, ${formatAmount(openMinor)}`}
          hint={`${description}, due ${dayText(dueOn)}`}
          checked={field.value.includes(id)}
          onChange={(checked) => tick(id, checked)}
        />
      ))}
    </Box>
  );
}
