import Box from '@mui/material/Box';
import Link from '@mui/material/Link';
import { Link as RouterLink } from 'react-router-dom';
import { dayText, monthText } from '../../../lib/club-time-text';
import { formatAmount } from '../../../lib/money';
import { SectionHeading } from '../../../shared-ui/section-heading';
import { StateLine } from '../../../shared-ui/states/state-line';
import type { Statement } from '../api/treasury';

/** Statements of the current account, latest first, each with what is left to settle on it. */
export function StatementsList({ statements, total }: { statements: readonly Statement[]; total: number }) {
  return (
    <Box component="section" aria-labelledby="statements">
      <SectionHeading
        id="statements"
        end={total > statements.length ? `${statements.length} of ${total}` : undefined}
      >
        Statements
      </SectionHeading>
      <Box component="ul" sx={{ m: 0, p: 0, listStyle: 'none' }}>
        {statements.map(({ id, fromOn, toOn, closingMinor, lineCount, matchedCount }) => (
          <Box
            component="li"
            key={id}
            sx={{
              display: 'grid',
              gridTemplateColumns: 'minmax(0, 1fr) auto 122px',
              alignItems: 'center',
              gap: '10px',
              minHeight: 44,
              borderBottom: '1px solid',
              borderColor: 'token.rule',
            }}
          >
            <Box sx={{ minWidth: 0 }}>
              <Link component={RouterLink} to={`/treasury/reconcile/${id}`}>
                {monthText(toOn)}
              </Link>
              <Box sx={{ typography: 'small', color: 'token.ink2' }}>
                {dayText(fromOn).slice(4)} to {dayText(toOn).slice(4)}
              </Box>
            </Box>
            <b>{formatAmount(closingMinor)}</b>
            {matchedCount === lineCount ? (
              <StateLine shape="tick" colour="green">
                All matched
              </StateLine>
            ) : (
              <StateLine shape="pennant" colour="copper">
                {lineCount - matchedCount} unmatched
              </StateLine>
            )}
          </Box>
        ))}
      </Box>
    </Box>
  );
}
