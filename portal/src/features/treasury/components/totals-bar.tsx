import Box from '@mui/material/Box';
import { useRef } from 'react';
import { formatMoney } from '../../../lib/money';
import { usePhone } from '../../../shared-ui/use-phone';
import { useToastsAbove } from '../../../shared-ui/use-toasts-above';
import type { StatementLine, Totals } from '../api/treasury';
import { afterMatch } from '../settling';

interface TotalsBarProps {
  totals: Totals;
  currency: string;
  /** An open line that is about to be settled. */
  settling: StatementLine | undefined;
}

/** The running difference, always in sight. */
export function TotalsBar({ totals, currency, settling }: TotalsBarProps) {
  const money = (minor: number) => formatMoney(minor, currency);
  const { openingMinor, matchedMinor, booksMinor, statementMinor, earlierMinor, differenceMinor } = totals;
  const bar = useRef<HTMLElement>(null);
  useToastsAbove(bar, usePhone());
  const isEven = differenceMinor === 0;
  return (
    <Box
      component="section"
      ref={bar}
      aria-label="Running difference"
      sx={{
        // On a wide screen the foot it stands in is what stays in sight.
        position: { xs: 'sticky', md: 'static' },
        bottom: 64,
        zIndex: 2,
        display: 'flex',
        flexWrap: 'wrap',
        alignItems: 'center',
        gap: { xs: '6px 28px', md: '6px 0' },
        m: { xs: '20px -16px 0', md: '14px -32px 0 -34px' },
        p: { xs: '8px 16px', md: '0 32px 0 34px' },
        borderTop: '1.5px solid',
        borderColor: 'token.ink',
        backgroundColor: 'token.sunk',
      }}
    >
      <Part label="Opening balance" value={money(openingMinor)} />
      <Part label="Matched so far" value={money(matchedMinor)} />
      {earlierMinor !== 0 && <Part label="Open from earlier" value={money(earlierMinor)} />}
      <Part label="Books say" value={money(booksMinor)} />
      <Part label="Statement says" value={money(statementMinor)} />
      <Box sx={{ ml: 'auto', display: 'flex', alignItems: 'flex-end', gap: '14px' }}>
        {settling && (
          <Box sx={{ pb: { xs: '4px', md: '18px' }, typography: 'small' }}>
            {money(afterMatch(totals, settling))} after this match
          </Box>
        )}
        <Part
          label="Difference"
          value={money(differenceMinor)}
          colour={isEven ? 'token.green' : 'token.copper'}
          isBig
        />
      </Box>
    </Box>
  );
}

interface PartProps {
  label: string;
  value: string;
  colour?: string;
  isBig?: boolean;
}

function Part({ label, value, colour = 'token.ink', isBig = false }: PartProps) {
  return (
    <Box
      role="group"
      aria-label={label}
      sx={{
        textAlign: isBig ? 'right' : 'left',
        color: colour,
        p: { md: isBig ? '10px 0 12px' : '10px 22px 12px' },
        ...(!isBig && {
          '&:first-of-type': { pl: 0 },
          borderRight: { md: '1px solid' },
          borderColor: { md: 'token.rule' },
        }),
      }}
    >
      <Box sx={{ typography: 'least', color: isBig ? colour : 'token.ink2' }}>{label}</Box>
      <Box sx={{ fontWeight: 700, fontSize: isBig ? '1.5rem' : '1.1875rem', lineHeight: 1.3 }}>{value}</Box>
    </Box>
  );
}
