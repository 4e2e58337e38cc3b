import Box from '@mui/material/Box';
import Button from '@mui/material/Button';
import { useQuery } from '@tanstack/react-query';
import { useState } from 'react';
import { clubCurrency } from '../../../lib/club-currency';
import { clubDay } from '../../../lib/club-time';
import { formatInClubZone, monthText } from '../../../lib/club-time-text';
import { Banner } from '../../../shared-ui/banner';
import { EmptyState } from '../../../shared-ui/empty-state';
import { LoadingBars } from '../../../shared-ui/loading-bars';
import { PageTitle } from '../../../shared-ui/page-title';
import { ProblemAlert } from '../../../shared-ui/problem-alert';
import { statementsQuery, summaryQuery, type OpenInvoice, type Summary } from '../api/treasury';
import { AgedDues } from '../components/aged-dues';
import { Figures } from '../components/figures';
import { ImportDrawer } from '../components/import-drawer';
import { InvoiceDrawer } from '../components/invoice-drawer';
import { OpenDues } from '../components/open-dues';
import { PaymentDrawer } from '../components/payment-drawer';
import { StatementsList } from '../components/statements-list';
import { TiersDrawer } from '../components/tiers-drawer';
import { UnmatchedLines } from '../components/unmatched-lines';

type Drawer = { kind: 'import' | 'invoice' | 'tiers' } | { kind: 'payment'; invoice?: OpenInvoice };

export default function TreasuryPage() {
  const [drawer, setDrawer] = useState<Drawer>();
  const summary = useQuery(summaryQuery);
  const currency = summary.data?.currency ?? clubCurrency();
  const close = () => setDrawer(undefined);
  return (
    <>
      <PageTitle
        tab="Treasury"
        actions={
          <>
            <Button variant="text" onClick={() => setDrawer({ kind: 'tiers' })}>
              Tiers
            </Button>
            <Button onClick={() => setDrawer({ kind: 'invoice' })}>Raise an invoice</Button>
            <Button onClick={() => setDrawer({ kind: 'payment' })}>Take a payment</Button>
            <Button variant="contained" onClick={() => setDrawer({ kind: 'import' })}>
              Import a statement
            </Button>
          </>
        }
      >
        Treasury, <b>{monthText(clubDay())}</b>
      </PageTitle>
      {summary.isPending && <LoadingBars rows={8} label="Loading the treasury" />}
      {summary.isError && <ProblemAlert error={summary.error} onRetry={() => void summary.refetch()} />}
      {summary.data && (
        <Treasury summary={summary.data} onTake={(invoice) => setDrawer({ kind: 'payment', invoice })} />
      )}
      <ImportDrawer open={drawer?.kind === 'import'} onClose={close} />
      {drawer?.kind === 'invoice' && <InvoiceDrawer currency={currency} onClose={close} />}
      {drawer?.kind === 'tiers' && <TiersDrawer currency={currency} onClose={close} />}
      {drawer?.kind === 'payment' && (
        <PaymentDrawer
          key={drawer.invoice?.id ?? 'any'}
          invoice={drawer.invoice}
          currency={currency}
          onClose={close}
        />
      )}
    </>
  );
}

function Treasury({ summary, onTake }: { summary: Summary; onTake: (invoice: OpenInvoice) => void }) {
  return (
    <Box sx={{ display: 'grid', gap: '24px' }}>
      {summary.cardNotes.length > 0 && <CardNotes notes={summary.cardNotes} />}
      <Figures summary={summary} />
      <Box
        sx={{
          display: 'grid',
          // By the room there is: an open drawer takes some of a wide screen's.
          gridTemplateColumns: 'repeat(auto-fit, minmax(min(310px, 100%), 1fr))',
          gap: '24px 32px',
          alignItems: 'start',
        }}
      >
        <AgedDues summary={summary} />
        <Statements />
      </Box>
      <OpenDues currency={summary.currency} onTake={onTake} />
    </Box>
  );
}

function Statements() {
  const query = useQuery(statementsQuery);
  if (query.isPending) return <LoadingBars rows={6} label="Loading the statements" />;
  if (query.isError) return <ProblemAlert error={query.error} onRetry={() => void query.refetch()} />;
  const { items, total } = query.data;
  if (items.length === 0)
    return (
      <EmptyState title="No statement yet. Import one.">
        The first one brings the current account’s opening balance into the books.
      </EmptyState>
    );
  const waiting = items.findLast(({ lineCount, matchedCount }) => matchedCount < lineCount);
  return (
    <>
      {waiting ? (
        <UnmatchedLines statement={waiting} />
      ) : (
        <EmptyState title="Every line is matched">
          The bank and the books agree on every statement.
        </EmptyState>
      )}
      <StatementsList statements={items} total={total} />
    </>
  );
}

function CardNotes({ notes }: { notes: Summary['cardNotes'] }) {
  return (
    <Banner kind="failed" title="The card service told of money that the books do not show.">
      {notes.map(({ id, note, receivedAt }) => (
        <Box key={id}>
          {formatInClubZone(receivedAt)}: {note}
        </Box>
      ))}
    </Banner>
  );
}
