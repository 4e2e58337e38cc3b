import Box from '@mui/material/Box';
import Button from '@mui/material/Button';
import Typography from '@mui/material/Typography';
import { useQuery } from '@tanstack/react-query';
import { Link as RouterLink } from 'react-router-dom';
import { dayText, monthText } from '../../../lib/club-time-text';
import { formatAmount } from '../../../lib/money';
import { capital, counted } from '../../../lib/text';
import { Icon } from '../../../shared-ui/icon';
import { LoadingBars } from '../../../shared-ui/loading-bars';
import { ProblemAlert } from '../../../shared-ui/problem-alert';
import { SectionHeading } from '../../../shared-ui/section-heading';
import { StateLine } from '../../../shared-ui/states/state-line';
import { statementQuery, type Statement, type StatementLine } from '../api/treasury';

const SHOWN = 6;

/** The screen's copper: lines of a statement that nobody has settled. */
export function UnmatchedLines({ statement }: { statement: Statement }) {
  const query = useQuery(statementQuery(statement.id));
  const left = statement.lineCount - statement.matchedCount;
  const lines = (query.data?.lines ?? []).filter(({ state }) => state === 'no match');
  return (
    <Box component="section" aria-labelledby="unmatched">
      <SectionHeading
        id="unmatched"
        needsYou
        end={`${monthText(statement.toOn)}, ${formatAmount(statement.unmatchedMinor)}`}
      >
        {capital(counted(left, 'line'))} unmatched
      </SectionHeading>
      {query.isPending && <LoadingBars rows={4} label="Loading the lines" />}
      {query.isError && <ProblemAlert error={query.error} onRetry={() => void query.refetch()} />}
      <Box component="ul" sx={{ m: 0, p: 0, listStyle: 'none' }}>
        {lines.slice(0, SHOWN).map((line) => (
          <Line key={line.id} line={line} />
        ))}
      </Box>
      {lines.length > SHOWN && (
        <Typography variant="small" component="p" sx={{ m: '8px 0 0', color: 'token.ink2' }}>
          and {lines.length - SHOWN} more
        </Typography>
      )}
      <Button
        component={RouterLink}
        to={`/treasury/reconcile/${statement.id}`}
        fullWidth
        endIcon={<Icon name="arrow" size={18} />}
        sx={{ mt: '12px' }}
      >
        Reconcile {monthText(statement.toOn)}
      </Button>
    </Box>
  );
}

function Line({ line: { day, description, amountMinor } }: { line: StatementLine }) {
  return (
    <Box
      component="li"
      sx={{
        display: 'grid',
        gridTemplateColumns: '52px minmax(0, 1fr) auto 92px',
        alignItems: 'center',
        gap: '10px',
        minHeight: 40,
        borderBottom: '1px solid',
        borderColor: 'token.rule',
      }}
    >
      <Box sx={{ color: 'token.ink2' }}>{dayText(day).slice(4)}</Box>
      <Box sx={{ fontWeight: 600, overflow: 'hidden', textOverflow: 'ellipsis', whiteSpace: 'nowrap' }}>
        {description}
      </Box>
      <b>{formatAmount(amountMinor)}</b>
      <StateLine shape="pennant" colour="copper">
        No match
      </StateLine>
    </Box>
  );
}
