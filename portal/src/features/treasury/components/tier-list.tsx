import Box from '@mui/material/Box';
import { formatMoney } from '../../../lib/money';
import { capital } from '../../../lib/text';
import type { Tier } from '../api/tiers';

/** 'for three months', 'for a month'. */
export const monthsText = (months: number): string => (months === 1 ? '1 month' : `${months} months`);

/** The dearest first, as the API has them. */
export function TierList({ tiers, currency }: { tiers: readonly Tier[]; currency: string }) {
  return (
    <Box component="ul" aria-label="Tiers" sx={{ m: 0, p: 0, listStyle: 'none' }}>
      {tiers.map(({ id, name, amountMinor, months }) => (
        <Box
          component="li"
          key={id}
          sx={{
            display: 'flex',
            alignItems: 'baseline',
            gap: '10px',
            py: '9px',
            borderBottom: '1px solid',
            borderColor: 'token.rule',
          }}
        >
          <Box component="b" sx={{ flex: 1, minWidth: 0 }}>
            {capital(name)}
          </Box>
          <b>{formatMoney(amountMinor, currency)}</b>
          <Box component="span" sx={{ typography: 'small', color: 'token.ink2' }}>
            for {monthsText(months)}
          </Box>
        </Box>
      ))}
    </Box>
  );
}
