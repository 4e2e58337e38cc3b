import Box from '@mui/material/Box';
import { DataRows } from './data-rows';
import type { Column, DataTableProps } from './data-table-types';
import { token } from './tokens';
import { usePhone } from './use-phone';

const ARROWS = { ascending: 'M2 7l3-4 3 4', descending: 'M2 3l3 4 3-4', none: '' } as const;

function Head<T>({ column }: { column: Column<T> }) {
  const { header, align = 'left', width, sort } = column;
  return (
    <Box component="th" scope="col" aria-sort={sort?.direction} sx={{ width, textAlign: align }}>
      {sort ? (
        <Box component="button" type="button" onClick={sort.onSort} className="sort">
          {header}
          <svg width="10" height="10" fill="none" stroke="currentColor" strokeWidth="1.6" aria-hidden>
            <path d={ARROWS[sort.direction]} />
          </svg>
        </Box>
      ) : (
        header
      )}
    </Box>
  );
}

const TABLE = {
  width: '100%',
  borderCollapse: 'collapse',
  '& th, & td': {
    height: 44,
    p: '4px 10px 4px 0',
    borderBottom: `1px solid ${token('rule')}`,
    fontWeight: 400,
  },
  '& th:last-child, & td:last-child': { pr: 0 },
  '& thead th': {
    height: 32,
    borderBottomColor: token('ink'),
    color: token('ink3'),
    fontSize: '0.71875rem',
    fontWeight: 600,
    verticalAlign: 'bottom',
  },
  '& tbody th': { textAlign: 'left', fontWeight: 700 },
  '& tr[data-open] > *': { backgroundColor: token('sheet') },
  '& tr[data-open]': { outline: `1.5px solid ${token('ink')}`, outlineOffset: '-1px' },
  '& tbody tr:has(button.open):hover > *': { backgroundColor: token('sunk') },
  '& .sort, & .open': {
    p: 0,
    border: 0,
    background: 'none',
    color: 'inherit',
    font: 'inherit',
    textAlign: 'inherit',
    cursor: 'pointer',
  },
  '& .open': { minHeight: 36, fontWeight: 700 },
} as const;

/** Rows between hairlines; on a phone each becomes two lines in the same order. */
export function DataTable<T>(props: DataTableProps<T>) {
  const { label, columns, rows, rowKey, onOpen, openKey, footer } = props;
  if (usePhone()) return <DataRows {...props} />;
  return (
    <>
      <Box component="table" aria-label={label} sx={TABLE}>
        <thead>
          <tr>
            {columns.map((column) => (
              <Head key={column.key} column={column} />
            ))}
          </tr>
        </thead>
        <tbody>
          {rows.map((row) => (
            <tr key={rowKey(row)} data-open={rowKey(row) === openKey || undefined}>
              {columns.map((column, index) =>
                index === 0 ? (
                  <th key={column.key} scope="row">
                    {onOpen ? (
                      <button type="button" className="open" onClick={() => onOpen(row)}>
                        {column.cell(row)}
                      </button>
                    ) : (
                      column.cell(row)
                    )}
                  </th>
                ) : (
                  <td key={column.key} style={{ textAlign: column.align }}>
                    {column.cell(row)}
                  </td>
                ),
              )}
            </tr>
          ))}
        </tbody>
      </Box>
      {footer && <Box sx={{ pt: '8px', typography: 'small', color: 'token.ink2' }}>{footer}</Box>}
    </>
  );
}
