import Box from '@mui/material/Box';
import Button from '@mui/material/Button';
import Link from '@mui/material/Link';
import Typography from '@mui/material/Typography';
import { useQuery } from '@tanstack/react-query';
import { useState } from 'react';
import { Link as RouterLink, useParams } from 'react-router-dom';
import { formatDate, monthText } from '../../../lib/club-time-text';
import { counted, countWord } from '../../../lib/text';
import { EmptyState } from '../../../shared-ui/empty-state';
import { LoadingBars } from '../../../shared-ui/loading-bars';
import { PageTitle } from '../../../shared-ui/page-title';
import { PhoneBar } from '../../../shared-ui/phone-bar';
import { ProblemAlert } from '../../../shared-ui/problem-alert';
import { SectionHeading } from '../../../shared-ui/section-heading';
import { useLetterKeys } from '../../../shared-ui/use-letter-keys';
import { statementQuery, type StatementDetail } from '../api/treasury';
import { BooksFoot } from '../components/books-foot';
import { BookRows } from '../components/book-rows';
import { ImportDrawer } from '../components/import-drawer';
import { LinePanel } from '../components/line-panel';
import { ReconcileFoot } from '../components/reconcile-foot';
import { StatementRows } from '../components/statement-rows';
import { TotalsBar } from '../components/totals-bar';
import { WiresPicture } from '../components/wires-picture';
import { booksShown, faultOf } from '../settling';
import { useSettling } from '../use-settling';
import { wiresOf } from '../wires';

/** However short the statement, the books show this many. */
const FEWEST_ROWS = 10;
const GRID = {
  display: 'grid',
  gridTemplateColumns: { lg: 'minmax(0, 1fr) auto minmax(0, 1.06fr)' },
  alignItems: 'start',
} as const;

export default function ReconcilePage() {
  const { statementId = '' } = useParams();
  const [isImporting, setIsImporting] = useState(false);
  const query = useQuery(statementQuery(statementId));
  const month = query.data ? monthText(query.data.toOn) : '';
  return (
    <>
      <PhoneBar title={`Reconcile ${month}`} backTo="/treasury" backLabel="Back to the treasury" />
      <PageTitle
        tab={`Reconcile ${month}`.trim()}
        over={
          <>
            <Link component={RouterLink} to="/treasury" color="inherit">
              Treasury
            </Link>
            {query.data && ` / Current account, ${importedText(query.data)}`}
          </>
        }
        actions={<Button onClick={() => setIsImporting(true)}>Import a statement</Button>}
      >
        Reconcile <b>{month}</b>
      </PageTitle>
      {query.isPending && <LoadingBars rows={12} label="Loading the statement" />}
      {query.isError && <ProblemAlert error={query.error} onRetry={() => void query.refetch()} />}
      {query.data && <Reconcile key={statementId} detail={query.data} />}
      <ImportDrawer open={isImporting} onClose={() => setIsImporting(false)} />
    </>
  );
}

/** 'twelve lines imported 2 Oct 2026, none twice'. */
function importedText({ lineCount, knownLines, importedAt }: StatementDetail): string {
  const known = knownLines === 0 ? 'none known before' : `${countWord(knownLines)} known before`;
  return `${counted(lineCount, 'line')} imported ${formatDate(importedAt)}, ${known}`;
}

function Reconcile({ detail }: { detail: StatementDetail }) {
  const settling = useSettling(detail);
  const [find, setFind] = useState('');
  const [isWhole, setIsWhole] = useState(false);
  const { line, choice } = settling;
  const { lines, matchedCount, lineCount } = detail;
  const most = isWhole ? Infinity : Math.max(lines.length, FEWEST_ROWS);
  const { shown, hidden } = booksShown(detail.books, line, choice, { find, most });
  const chosenIds = new Set(choice.items.map(({ id }) => id));
  const isOpen = line?.state === 'no match';
  useLetterKeys({ a: settling.accept, n: settling.next, u: settling.takeBack });
  return (
    <>
      <Box sx={GRID}>
        <section aria-labelledby="on-the-statement">
          <SectionHeading id="on-the-statement" end={`${matchedCount} of ${lineCount} matched`}>
            On the statement
          </SectionHeading>
          <StatementRows lines={lines} openedId={line?.id} onOpen={settling.open} />
        </section>
        <Box sx={{ pt: '34px' }}>
          <WiresPicture
            wires={wiresOf(lines, shown, line?.id, chosenIds)}
            rows={Math.max(lines.length, shown.length)}
          />
        </Box>
        <Box component="section" aria-labelledby="in-the-books" sx={{ mt: { xs: '24px', lg: 0 } }}>
          <SectionHeading id="in-the-books" end="Payments and invoices still open">
            In the books
          </SectionHeading>
          {shown.length === 0 && (
            <EmptyState title="Nothing is open">Settle the line against an account.</EmptyState>
          )}
          <BookRows
            books={shown}
            openedId={line?.id}
            chosenIds={chosenIds}
            onChoose={isOpen ? settling.toggle : undefined}
          />
          <BooksFoot
            {...{ find, hidden, isWhole }}
            leftOut={detail.booksLeftOut}
            onFind={setFind}
            onWhole={setIsWhole}
          />
        </Box>
      </Box>
      <Typography
        variant="small"
        component="p"
        sx={{ color: 'token.ink2', display: { xs: 'none', md: 'block' } }}
      >
        <b>A</b> accepts, <b>N</b> goes to the next line, <b>U</b> takes back the opened match.
      </Typography>
      <ReconcileFoot>
        {line && (
          <LinePanel
            line={line}
            detail={detail}
            choice={choice}
            onChoice={settling.setChoice}
            onAccept={settling.accept}
            onTakeBack={settling.takeBack}
            isBusy={settling.isBusy}
            error={settling.error}
          />
        )}
        <TotalsBar
          totals={detail.totals}
          currency={detail.currency}
          settling={isOpen && !faultOf(line, choice) ? line : undefined}
        />
      </ReconcileFoot>
    </>
  );
}
