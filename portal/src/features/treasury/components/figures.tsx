import Box from '@mui/material/Box';
import Typography from '@mui/material/Typography';
import type { ReactNode } from 'react';
import { dayText } from '../../../lib/club-time-text';
import { formatAmount, formatMoney } from '../../../lib/money';
import type { Summary } from '../api/treasury';
import { cashAndCardMinor, heldMinor, partsOf } from '../holdings';

/** The four figures, each with the parts it is made of. */
export function Figures({ summary }: { summary: Summary }) {
  const { holdings, currency } = summary;
  const money = (minor: number) => formatMoney(minor, currency);
  return (
    <Box
      component="section"
      aria-label="The club’s money"
      sx={{
        display: 'grid',
        gridTemplateColumns: { xs: '1fr', sm: '1fr 1fr', lg: '1.25fr 1fr 1fr 1fr' },
        border: '1.5px solid',
        borderColor: 'token.ink',
        borderRadius: '3px',
        backgroundColor: 'token.sheet',
      }}
    >
      <DuesIn summary={summary} />
      <Figure label="Current account, by the books" value={money(holdings.currentAccountMinor)}>
        In this month {formatAmount(holdings.inThisMonthMinor)}
        <br />
        Out {formatAmount(holdings.outThisMonthMinor)}
      </Figure>
      <Figure label="Cash box and money on its way" value={money(cashAndCardMinor(holdings))}>
        {partsOf(holdings).map(([name, minor]) => (
          <span key={name} style={{ display: 'block' }}>
            {name} {formatAmount(minor)}
          </span>
        ))}
      </Figure>
      <Figure label="All the club holds" value={money(heldMinor(holdings))}>
        {[holdings.currentAccountMinor, ...partsOf(holdings).map(([, minor]) => minor)]
          .map((minor) => formatAmount(minor))
          .join(' + ')}
      </Figure>
    </Box>
  );
}

function DuesIn({ summary: { dues, currency } }: { summary: Summary }) {
  if (!dues)
    return (
      <Figure label="Dues in" value={formatMoney(0, currency)}>
        No dues were raised yet.
      </Figure>
    );
  const { description, dueOn, raisedMinor, paidMinor, count, paidCount } = dues;
  const share = raisedMinor === 0 ? 0 : paidMinor / raisedMinor;
  return (
    <Figure
      label={`Dues in, ${runName(description)}`}
      value={formatMoney(paidMinor, currency)}
      beside={`of ${formatAmount(raisedMinor)} raised`}
    >
      <Box aria-hidden sx={{ my: '8px', height: 13, border: '1px solid', borderColor: 'token.ink' }}>
        <Box sx={{ width: `${share * 100}%`, height: '100%', backgroundColor: 'token.green' }} />
      </Box>
      {paidCount} of {count} invoices
      {paidMinor < raisedMinor &&
        `, ${formatAmount(raisedMinor - paidMinor)} to come by ${dayText(dueOn).slice(4)}`}
    </Figure>
  );
}

/** 'December to February' of 'Dues, December to February'. */
const runName = (description: string): string => description.replace(/^dues,\s*/i, '');

interface FigureProps {
  label: string;
  value: string;
  beside?: string;
  children: ReactNode;
}

function Figure({ label, value, beside, children }: FigureProps) {
  return (
    <Box
      sx={{
        p: '12px 18px 14px',
        minWidth: 0,
        '& + &': { borderLeft: { lg: '1px solid' }, borderTop: { xs: '1px solid', lg: 0 } },
        '&&': { borderColor: 'token.rule' },
      }}
    >
      <Typography variant="small" component="div" sx={{ color: 'token.ink2' }}>
        {label}
      </Typography>
      <Box sx={{ display: 'flex', flexWrap: 'wrap', alignItems: 'baseline', gap: '0 8px' }}>
        <Box component="b" sx={{ fontSize: '1.5rem', lineHeight: '2rem' }}>
          {value}
        </Box>
        {beside && <Box sx={{ fontSize: '0.8125rem', fontWeight: 600, color: 'token.ink2' }}>{beside}</Box>}
      </Box>
      <Typography variant="small" component="div" sx={{ color: 'token.ink2' }}>
        {children}
      </Typography>
    </Box>
  );
}
