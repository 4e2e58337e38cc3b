import Box from '@mui/material/Box';
import { memo } from 'react';
import { VerdictLine } from '../../../shared-ui/states/state-line';
import { VERDICTS } from '../../../shared-ui/states/state-words';
import { token } from '../../../shared-ui/tokens';
import type { ProductListProps } from './product-table';
import { afterFilter, belowWanted, megahertz, wordsOf } from './words';

/** The table on a phone: two lines a product, the worst first and the wanted one, which is pinned, last. */
export const ProductRows = memo(function ProductRows({ mixing, rows, marked }: ProductListProps) {
  const worstFirst = [...rows].sort((a, b) => Number(a.product.isWanted) - Number(b.product.isWanted));
  return (
    <Box
      component="ul"
      aria-label="Products"
      sx={{ m: 0, p: 0, listStyle: 'none', borderTop: `1px solid ${token('ink')}`, typography: 'small' }}
    >
      {worstFirst.map(({ product, note }) => {
        const [below, pm] = belowWanted(product);
        const level = `${afterFilter(product)} dBm after the filter`;
        return (
          <Box
            component="li"
            key={product.name}
            aria-current={product.name === marked || undefined}
            sx={{
              py: '6px',
              borderBottom: `1px solid ${token('rule')}`,
              ...(product.name === marked && {
                outline: `1.5px solid ${token('ink')}`,
                backgroundColor: 'token.sheet',
              }),
            }}
          >
            <Box sx={{ display: 'flex', justifyContent: 'space-between', gap: '12px' }}>
              <span>
                <b>{product.name}</b>
                {note && ` ${note}`}, {megahertz(product.hertz)}
              </span>
              <Box component="span" sx={{ flex: 'none' }}>
                <VerdictLine verdict={product.verdict}>{VERDICTS[product.verdict].short}</VerdictLine>
              </Box>
            </Box>
            <Box sx={{ color: 'token.ink2' }}>
              {below ? `${level}, ${[below, pm].filter(Boolean).join(' ')} dB below` : level}
              {product.verdict === 'pass' && !product.isWanted ? '' : `. ${wordsOf(product, mixing)}`}
            </Box>
          </Box>
        );
      })}
    </Box>
  );
});
