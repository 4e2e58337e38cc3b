import Box from '@mui/material/Box';
import type { ReactNode } from 'react';
import { amountWords } from '../../../lib/amount-words';
import { dateText } from '../../../lib/club-time-text';
import { formatAmount, formatMoney } from '../../../lib/money';
import { Mark } from '../../../shared-ui/mark';
import type { Receipt } from '../api/dues';
import { PAID_HOW } from '../how';

const SHEET = {
  mt: '12px',
  p: '16px 20px',
  border: '1px solid',
  borderColor: 'token.edge',
  backgroundColor: 'token.sheet',
  fontSize: '0.8125rem',
  lineHeight: '1.1875rem',
  '@media print': {
    mt: 0,
    border: '1px solid #000',
    fontSize: '9.5pt',
    lineHeight: '14pt',
    maxWidth: '180mm',
  },
} as const;

/** The receipt itself: number, from, for, amount in figures and words, how and when paid, who took it. */
export function ReceiptSheet({ receipt }: { receipt: Receipt }) {
  const { receiptNumber, clubName, clubAddress, personName, receivedOn, paid, creditMinor, currency } =
    receipt;
  return (
    <Box sx={SHEET}>
      <Box sx={{ display: 'flex', gap: '12px', alignItems: 'flex-start' }}>
        <Box sx={{ pt: '2px' }} aria-hidden>
          <Mark width={32} />
        </Box>
        <Box sx={{ flex: 1, minWidth: 0 }}>
          <b>{clubName}</b>
          <Box sx={{ color: 'token.ink2' }}>{clubAddress}</Box>
        </Box>
        <Box sx={{ textAlign: 'right' }}>
          Receipt
          <Box sx={{ fontWeight: 700, fontSize: '0.9375rem' }}>{receiptNumber}</Box>
        </Box>
      </Box>
      <Box sx={{ mt: '14px', mb: '8px' }}>
        Received with thanks from <b>{personName}</b> on <b>{dateText(receivedOn)}</b>
      </Box>
      <Box sx={{ borderTop: '1px solid', borderBottom: '1px solid', borderColor: 'token.ink' }}>
        {paid.map(({ invoiceId, invoiceNumber, description, amountMinor }) => (
          <Line key={invoiceId} what={`${invoiceNumber} ${description}`} amount={formatAmount(amountMinor)} />
        ))}
        {creditMinor > 0 && (
          <Line what="On account, for the next invoice" amount={formatAmount(creditMinor)} />
        )}
        <Line
          isTotal
          what={amountWords(receipt.amountMinor, currency)}
          amount={formatMoney(receipt.amountMinor, currency)}
        />
      </Box>
      <Box
        sx={{
          display: 'flex',
          justifyContent: 'space-between',
          gap: '16px',
          mt: '10px',
          color: 'token.ink2',
        }}
      >
        <span>{PAID_HOW[receipt.method]}</span>
        {receipt.treasurerName && <span>{receipt.treasurerName}, treasurer</span>}
      </Box>
    </Box>
  );
}

function Line({ what, amount, isTotal = false }: { what: ReactNode; amount: string; isTotal?: boolean }) {
  return (
    <Box
      sx={{
        display: 'flex',
        justifyContent: 'space-between',
        gap: '16px',
        py: '3px',
        fontWeight: isTotal ? 700 : 400,
        borderBottom: isTotal ? 0 : '1px solid',
        borderColor: 'token.rule',
      }}
    >
      <span>{what}</span>
      <b>{amount}</b>
    </Box>
  );
}
