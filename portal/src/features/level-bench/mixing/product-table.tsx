import Box from '@mui/material/Box';
import { memo } from 'react';
import { fixed } from '../../../lib/text';
import { VerdictLine } from '../../../shared-ui/states/state-line';
import { token } from '../../../shared-ui/tokens';
import type { ProductRow } from './rows';
import { afterFilter, belowWanted, decibels, megahertz, wordsOf } from './words';
import type { Mixing } from './work-out';

export interface ProductListProps {
  mixing: Mixing;
  rows: readonly ProductRow[];
  /** Marked from the picture. */
  marked?: string;
}

const TABLE = {
  width: '100%',
  borderCollapse: 'collapse',
  typography: 'small',
  '& th, & td': {
    p: '7px 9px 7px 0',
    whiteSpace: 'nowrap',
    borderBottom: `1px solid ${token('rule')}`,
    fontWeight: 400,
    textAlign: 'right',
  },
  '& th:last-child, & td:last-child': { pr: 0 },
  '& thead th': {
    py: '4px',
    borderBottomColor: token('ink'),
    color: token('ink2'),
    fontWeight: 600,
    verticalAlign: 'bottom',
  },
  '& th:first-of-type, & th:last-child, & td:last-child': { textAlign: 'left' },
  '& b': { fontWeight: 700 },
  '& tr[data-verdict="too close to call"] > *': { backgroundColor: token('brassTint') },
  '& tr[data-verdict="not yet"] > *': { backgroundColor: token('oxideTint') },
  '& tr[data-verdict] > th': { pl: '8px' },
  '& tr[aria-current]': { outline: `1.5px solid ${token('ink')}`, outlineOffset: '-1px' },
  '& tr[aria-current]:not([data-verdict]) > *': { backgroundColor: token('sheet') },
} as const;

const muted = { color: 'token.ink2' } as const;

function Row({ row, mixing, isMarked }: { row: ProductRow; mixing: Mixing; isMarked: boolean }) {
  const { product, note } = row;
  const [below, pm] = belowWanted(product);
  const isPass = product.verdict === 'pass';
  return (
    <tr data-verdict={isPass ? undefined : product.verdict} aria-current={isMarked || undefined}>
      <th scope="row">
        <b>{product.name}</b>{' '}
        <Box component="span" sx={muted}>
          {note}
        </Box>
      </th>
      <td>{megahertz(product.hertz)}</td>
      <td>{product.order}</td>
      <td>{fixed(product.levelDbm)}</td>
      <td>
        <b>{afterFilter(product)}</b>
      </td>
      <td>
        <b>{below}</b>{' '}
        <Box component="span" sx={muted}>
          {pm}
        </Box>
      </td>
      <td>
        <Box sx={{ display: 'flex', flexWrap: 'wrap', alignItems: 'center', gap: '0 8px', pl: '8px' }}>
          <VerdictLine verdict={product.verdict}>
            {product.isWanted && isPass ? 'In the band' : undefined}
          </VerdictLine>
          <Box component="span" sx={muted}>
            {wordsOf(product, mixing)}
          </Box>
        </Box>
      </td>
    </tr>
  );
}

/** The twin of the picture: same products, in the order of the harm they do. */
export const ProductTable = memo(function ProductTable({ mixing, rows, marked }: ProductListProps) {
  return (
    <Box component="table" aria-label="Products" sx={TABLE}>
      <thead>
        <tr>
          <th scope="col">Product</th>
          <th scope="col">MHz</th>
          <th scope="col">Order</th>
          <th scope="col">Expected, dBm</th>
          <th scope="col">After filter</th>
          <th scope="col">Below wanted, dB</th>
          <th scope="col">
            <Box component="span" sx={{ pl: '8px' }}>
              Against {decibels(mixing.values.goalDb)}
            </Box>
          </th>
        </tr>
      </thead>
      <tbody>
        {rows.map((row) => (
          <Row key={row.product.name} row={row} mixing={mixing} isMarked={row.product.name === marked} />
        ))}
      </tbody>
    </Box>
  );
});
