import Box from '@mui/material/Box';
import Link from '@mui/material/Link';
import { dateText, dayText } from '../../../lib/club-time-text';
import { formatAmount, formatMoney } from '../../../lib/money';
import { AssetTag } from '../../../shared-ui/asset-tag';
import { DataTable } from '../../../shared-ui/data-table';
import type { Column } from '../../../shared-ui/data-table-types';
import { SectionHeading } from '../../../shared-ui/section-heading';
import { StateLine } from '../../../shared-ui/states/state-line';
import type { MyDues, Payment } from '../api/dues';
import { HOW } from '../how';

interface Row {
  key: string;
  payment: Payment;
  number: string;
  description: string;
  amountMinor: number;
}

/** One row for each invoice a payment paid; what it left over is a row of its own. */
function rowsOf(payments: readonly Payment[]): Row[] {
  return payments.flatMap((payment) => [
    ...payment.paid.map(({ invoiceId, invoiceNumber, description, amountMinor }) => ({
      key: `${payment.id}:${invoiceId}`,
      payment,
      number: invoiceNumber,
      description,
      amountMinor,
    })),
    ...(payment.creditMinor > 0
      ? [
          {
            key: `${payment.id}:credit`,
            payment,
            number: '',
            description: 'On account, for the next invoice',
            amountMinor: payment.creditMinor,
          },
        ]
      : []),
  ]);
}

const columnsFor = (onReceipt: (paymentId: string) => void): Column<Row>[] => [
  {
    key: 'received',
    header: 'Received',
    cell: ({ payment }) => (
      <Box component="span" sx={{ fontWeight: 400 }}>
        {dayText(payment.receivedOn).slice(4)}
      </Box>
    ),
    width: 76,
    phone: 'second',
  },
  {
    key: 'invoice',
    header: 'Invoice',
    cell: ({ number }) => number && <AssetTag>{number}</AssetTag>,
    width: 86,
    phone: 'hidden',
  },
  { key: 'for', header: 'For', cell: ({ description }) => description, phone: 'first' },
  { key: 'how', header: 'How', cell: ({ payment }) => HOW[payment.method], width: 92 },
  {
    key: 'amount',
    header: 'Amount',
    cell: ({ amountMinor }) => <b>{formatAmount(amountMinor)}</b>,
    align: 'right',
    width: 84,
    phone: 'end',
  },
  {
    key: 'receipt',
    header: 'Receipt',
    cell: ({ payment }) =>
      payment.isBeingMatched ? (
        <StateLine shape="half" colour="trace">
          Being matched
        </StateLine>
      ) : (
        <Link component="button" onClick={() => onReceipt(payment.id)}>
          {payment.receiptNumber}
        </Link>
      ),
    align: 'right',
    width: 140,
  },
];

interface PaidListProps {
  dues: MyDues;
  onReceipt: (paymentId: string) => void;
}

export function PaidList({ dues, onReceipt }: PaidListProps) {
  const { payments, currency } = dues;
  const first = payments.at(-1);
  const sum = payments.reduce((total, { amountMinor }) => total + amountMinor, 0);
  return (
    <Box component="section" aria-labelledby="paid">
      <SectionHeading
        id="paid"
        end={first && `${formatMoney(sum, currency)} since ${dateText(first.receivedOn)}`}
      >
        Paid
      </SectionHeading>
      {first ? (
        <DataTable
          label="Paid"
          columns={columnsFor(onReceipt)}
          rows={rowsOf(payments)}
          rowKey={({ key }) => key}
        />
      ) : (
        <Box sx={{ py: '12px', color: 'token.ink2' }}>Nothing paid yet. Receipts will be kept here.</Box>
      )}
    </Box>
  );
}
