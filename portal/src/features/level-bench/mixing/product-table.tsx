import Box from '@mui/material/Box';
import { memo } from 'react';
import { fixed } from '../../../lib/text';
import { StateMark } from '../../../shared-ui/states/shape';
import { VERDICTS } from '../../../shared-ui/states/state-words';
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
  '& .note': { color: token('ink2') },
  '& .against': { display: 'flex', flexWrap: 'wrap', alignItems: 'center', gap: '0 8px', paddingLeft: '8px' },
  '& .verdict': { display: 'inline-flex', alignItems: 'center', gap: '6px', fontWeight: 600 },
  '& tr[data-verdict="pass"] .verdict': { color: token('green') },
  '& tr[data-verdict="too close to call"] .verdict': { color: token('brass') },
  '& tr[data-verdict="not yet"] .verdict': { color: token('oxide') },
  '& tr[data-verdict="too close to call"] > *': { backgroundColor: token('brassTint') },
  '& tr[data-verdict="not yet"] > *': { backgroundColor: token('oxideTint') },
  '& tr[data-verdict]:not([data-verdict="pass"]) > th': { pl: '8px' },
  '& tr[aria-current]': { outline: `1.5px solid ${token('ink')}`, outlineOffset: '-1px' },
  '& tr[aria-current][data-verdict="pass"] > *': { backgroundColor: token('sheet') },
} as const;

function Row({ row, mixing, isMarked }: { row: ProductRow; mixing: Mixing; isMarked: boolean }) {
  const { product, note } = row;
  const [below, pm] = belowWanted(product);
  const { shape, words } = VERDICTS[product.verdict];
  return (
    <tr data-verdict={product.verdict} aria-current={isMarked || undefined}>
      <th scope="row">
        <b>{product.name}</b> <span className="note">{note}</span>
      </th>
      <td>{megahertz(product.hertz)}</td>
      <td>{product.order}</td>
      <td>{fixed(product.levelDbm)}</td>
      <td>
        <b>{afterFilter(product)}</b>
      </td>
      <td>
        <b>{below}</b> <span className="note">{pm}</span>
      </td>
      <td>
        <span className="against">
          <span className="verdict">
            <StateMark name={shape} size={14} />
            {product.isWanted && product.verdict === 'pass' ? 'In the band' : words}
          </span>
          <span className="note">{wordsOf(product, mixing)}</span>
        </span>
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
            <span className="against">Against {decibels(mixing.values.goalDb)}</span>
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
