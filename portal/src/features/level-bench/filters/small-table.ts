import { token } from '../../../shared-ui/tokens';

/** A table of figures in a side column: rows lower than the usual, all but the first column at the right. */
export const smallTable = (rowHeight: number) =>
  ({
    width: '100%',
    borderCollapse: 'collapse',
    fontSize: '0.8125rem',
    '& th, & td': {
      height: rowHeight,
      p: '2px 0 2px 6px',
      borderBottom: `1px solid ${token('rule')}`,
      fontWeight: 400,
      textAlign: 'right',
      whiteSpace: 'nowrap',
      verticalAlign: 'middle',
      '& > span': { verticalAlign: 'middle' },
    },
    '& th:first-of-type': { pl: 0, textAlign: 'left' },
    '& thead th': {
      borderBottomColor: token('ink'),
      color: token('ink2'),
      fontSize: '0.75rem',
      fontWeight: 600,
    },
    '& tbody th': { fontWeight: 700 },
  }) as const;
