import Box from '@mui/material/Box';
import { dayText } from '../../../lib/club-time-text';
import { formatAmount } from '../../../lib/money';
import { StateLine } from '../../../shared-ui/states/state-line';
import type { StatementLine } from '../api/treasury';
import { ROW } from '../wires';

interface StatementRowsProps {
  lines: readonly StatementLine[];
  openedId: string | undefined;
  onOpen: (lineId: string) => void;
}

/** The bank's side: each line with its state in words; a line is a button that opens it. */
export function StatementRows({ lines, openedId, onOpen }: StatementRowsProps) {
  return (
    <Box component="ul" aria-label="Lines of the statement" sx={{ m: 0, p: 0, listStyle: 'none' }}>
      {lines.map(({ id, day, description, amountMinor, state }) => (
        <Box component="li" key={id}>
          <Box
            component="button"
            type="button"
            aria-pressed={id === openedId}
            onClick={() => onOpen(id)}
            sx={{
              display: 'grid',
              gridTemplateColumns: { xs: '58px minmax(0, 1fr) auto', md: '58px minmax(0, 1fr) auto 92px' },
              alignItems: 'center',
              gap: '8px',
              width: '100%',
              height: { md: ROW },
              minHeight: ROW,
              p: { xs: '6px 6px 6px 0', md: 0 },
              fontSize: '0.84375rem',
              border: 0,
              borderBottom: '1px solid',
              borderColor: 'token.rule',
              background: 'none',
              color: 'token.ink',
              font: 'inherit',
              textAlign: 'left',
              cursor: 'pointer',
              '&:hover': { backgroundColor: 'token.sunk' },
              ...(id === openedId && {
                '&, &:hover': { backgroundColor: 'token.sheet' },
                outline: '1.5px solid',
                outlineColor: 'token.ink',
                outlineOffset: '-1.5px',
                // The open thing stands proud of its column.
                width: { xs: '100%', md: 'calc(100% + 10px)' },
                ml: { md: '-10px' },
                pl: { md: '10px' },
              }),
            }}
          >
            <Box
              component="span"
              sx={{ color: 'token.ink2', pl: { xs: '6px', md: 0 }, whiteSpace: 'nowrap' }}
            >
              {dayText(day).slice(4)}
            </Box>
            <Box
              component="span"
              sx={{
                fontWeight: state === 'matched' ? 400 : 700,
                overflow: 'hidden',
                textOverflow: 'ellipsis',
                whiteSpace: { md: 'nowrap' },
              }}
            >
              {description}
            </Box>
            <Box component="b" sx={{ fontWeight: state === 'matched' ? 400 : 700 }}>
              {formatAmount(amountMinor)}
            </Box>
            <Box component="span" sx={{ display: 'flex', gridColumn: { xs: '2 / 4', md: 'auto' } }}>
              {state === 'matched' ? (
                <StateLine shape="tick" colour="green">
                  Matched
                </StateLine>
              ) : (
                <StateLine shape="pennant" colour="copper">
                  No match
                </StateLine>
              )}
            </Box>
          </Box>
        </Box>
      ))}
    </Box>
  );
}
