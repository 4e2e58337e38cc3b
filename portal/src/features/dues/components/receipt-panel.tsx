import Box from '@mui/material/Box';
import Link from '@mui/material/Link';
import Typography from '@mui/material/Typography';
import { useQuery } from '@tanstack/react-query';
import { LoadingBars } from '../../../shared-ui/loading-bars';
import { ProblemAlert } from '../../../shared-ui/problem-alert';
import { SectionHeading } from '../../../shared-ui/section-heading';
import { receiptQuery } from '../api/dues';
import { ReceiptSheet } from './receipt-sheet';

/** One receipt, on the page and on paper: when the page is printed, nothing else is. */
export function ReceiptPanel({ paymentId }: { paymentId: string }) {
  const query = useQuery(receiptQuery(paymentId));
  if (query.isPending) return <LoadingBars rows={5} label="Loading the receipt" />;
  if (query.isError) return <ProblemAlert error={query.error} onRetry={() => void query.refetch()} />;
  return (
    <Box component="section" aria-labelledby="receipt">
      <Box sx={{ '@media print': { display: 'none' } }}>
        <SectionHeading
          id="receipt"
          end={
            <Link component="button" onClick={() => window.print()}>
              Print
            </Link>
          }
        >
          Receipt {query.data.receiptNumber}
        </SectionHeading>
      </Box>
      <ReceiptSheet receipt={query.data} />
      {query.data.isBeingMatched && (
        <Typography
          variant="small"
          component="p"
          sx={{ color: 'token.ink2', '@media print': { display: 'none' } }}
        >
          Written down; the bank’s statement has yet to show it.
        </Typography>
      )}
    </Box>
  );
}
