import Box from '@mui/material/Box';
import { useQuery } from '@tanstack/react-query';
import { useSearchParams } from 'react-router-dom';
import { clubDay } from '../../../lib/club-time';
import { capital } from '../../../lib/text';
import { dateText, dayText } from '../../../lib/club-time-text';
import { EmptyState } from '../../../shared-ui/empty-state';
import { LoadingBars } from '../../../shared-ui/loading-bars';
import { PageTitle } from '../../../shared-ui/page-title';
import { PhoneBar } from '../../../shared-ui/phone-bar';
import { ProblemAlert } from '../../../shared-ui/problem-alert';
import { usePhone } from '../../../shared-ui/use-phone';
import { myDuesQuery, myInvoicesQuery, type Invoice, type MyDues } from '../api/dues';
import { ArrearsBanner } from '../components/arrears-banner';
import { CardReturn } from '../components/card-return';
import { ComingUp } from '../components/coming-up';
import { OwedCard } from '../components/owed-card';
import { PaidList } from '../components/paid-list';
import { ReceiptPanel } from '../components/receipt-panel';
import { nothingOwedText, standingOf } from '../standing';

/** On paper there is the receipt and nothing else. */
const NOT_ON_PAPER = { '@media print': { display: 'none' } } as const;

export default function DuesPage() {
  const dues = useQuery(myDuesQuery);
  const invoices = useQuery(myInvoicesQuery);
  const today = clubDay();
  const tier = dues.data?.tier ? `${capital(dues.data.tier.name)} tier` : '';
  const isPhone = usePhone();
  const failed = [dues, invoices].find(({ isError }) => isError);
  return (
    <>
      <PhoneBar title="Your dues" backTo="/" backLabel="Back to Tonight" end={tier} />
      <Box sx={NOT_ON_PAPER}>
        {!isPhone && (
          <PageTitle
            tab="Dues"
            over={[tier, `${dayText(today).slice(0, 3)} ${dateText(today)}`].filter(Boolean).join(', ')}
          >
            Your <b>dues</b>
          </PageTitle>
        )}
      </Box>
      {failed && (
        <ProblemAlert
          error={failed.error}
          onRetry={() => {
            void dues.refetch();
            void invoices.refetch();
          }}
        />
      )}
      {!failed && dues.data && invoices.data && (
        <Dues dues={dues.data} invoices={invoices.data} today={today} />
      )}
      {!failed && (dues.isPending || invoices.isPending) && (
        <LoadingBars rows={8} label="Loading your dues" />
      )}
    </>
  );
}

interface DuesProps {
  dues: MyDues;
  invoices: Invoice[];
  today: string;
}

function Dues({ dues, invoices, today }: DuesProps) {
  const [search, setSearch] = useSearchParams();
  const standing = standingOf(invoices, today);
  const open = [...standing.owed, ...standing.comingUp];
  const chosen = open.find(({ id }) => id === search.get('invoice')) ?? standing.owed[0];
  const receiptId = search.get('receipt') ?? dues.payments.find(({ isBeingMatched }) => !isBeingMatched)?.id;
  const put = (changes: Record<string, string | undefined>) =>
    setSearch(
      (before) => {
        const next = new URLSearchParams(before);
        for (const [name, value] of Object.entries(changes))
          if (value === undefined) next.delete(name);
          else next.set(name, value);
        return next;
      },
      { replace: true, preventScrollReset: true },
    );
  const showReceipt = (receipt: string) => put({ receipt });
  const choose = (invoice: string) => put({ invoice, card: undefined });
  const card = search.get('card');
  const cardInvoice = search.get('invoice');
  return (
    <>
      <Box sx={NOT_ON_PAPER}>
        {(card === 'returned' || card === 'left') && cardInvoice && (
          <Box sx={{ mb: '14px' }}>
            <CardReturn
              invoiceId={cardInvoice}
              how={card}
              onReceipt={showReceipt}
              onDone={() => put({ card: undefined, invoice: undefined })}
            />
          </Box>
        )}
        <ArrearsBanner standing={standing} dues={dues} />
      </Box>
      <Box
        sx={{
          display: 'grid',
          gridTemplateColumns: { lg: 'minmax(0, 1fr) 424px' },
          gap: '24px 34px',
          alignItems: 'start',
        }}
      >
        <Box sx={{ display: 'grid', gap: '22px', minWidth: 0, ...NOT_ON_PAPER }}>
          {chosen ? (
            <OwedCard standing={standing} invoice={chosen} dues={dues} onChoose={choose} />
          ) : (
            <EmptyState title={nothingOwedText(standing)}>
              {standing.comingUp.length > 0
                ? 'What is coming up can be paid now, too.'
                : 'The next invoice shows here when it is raised, and comes with its reference.'}
            </EmptyState>
          )}
          <PaidList dues={dues} onReceipt={showReceipt} />
        </Box>
        <Box sx={{ display: 'grid', gap: '26px', minWidth: 0 }}>
          {receiptId && <ReceiptPanel key={receiptId} paymentId={receiptId} />}
          <Box sx={NOT_ON_PAPER}>
            <ComingUp
              invoices={standing.comingUp.filter(({ id }) => id !== chosen?.id)}
              dues={dues}
              onChoose={choose}
            />
          </Box>
        </Box>
      </Box>
    </>
  );
}
