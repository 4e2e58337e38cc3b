import Box from '@mui/material/Box';
import { Fragment } from 'react';
import type { Column, DataTableProps } from './data-table-types';

function place<T>(column: Column<T>, index: number): NonNullable<Column<T>['phone']> {
  return column.phone ?? (index === 0 ? 'first' : 'second');
}

/** A table on a phone: a list of two-line rows, the name and its end value over the rest. */
export function DataRows<T>({ label, columns, rows, rowKey, onOpen, openKey, footer }: DataTableProps<T>) {
  const at = (where: NonNullable<Column<T>['phone']>) =>
    columns.filter((column, index) => place(column, index) === where);
  return (
    <>
      <Box component="ul" aria-label={label} sx={{ m: 0, p: 0, listStyle: 'none' }}>
        {rows.map((row) => (
          <Box
            component="li"
            key={rowKey(row)}
            sx={{
              display: 'flex',
              alignItems: 'center',
              gap: '12px',
              py: '9px',
              borderBottom: '1px solid',
              borderColor: 'token.rule',
              ...(rowKey(row) === openKey && { backgroundColor: 'token.sheet' }),
            }}
          >
            <Box sx={{ flex: 1, minWidth: 0 }}>
              <Box
                sx={{ display: 'flex', alignItems: 'center', justifyContent: 'space-between', gap: '12px' }}
              >
                <Box
                  {...(onOpen ? { component: 'button', type: 'button', onClick: () => onOpen(row) } : {})}
                  sx={{
                    p: 0,
                    border: 0,
                    background: 'none',
                    color: 'inherit',
                    font: 'inherit',
                    fontWeight: 700,
                    textAlign: 'left',
                    minHeight: onOpen ? 36 : 0,
                  }}
                >
                  {at('first').map((column) => (
                    <Fragment key={column.key}>{column.cell(row)} </Fragment>
                  ))}
                </Box>
                <Box sx={{ flex: 'none', display: 'flex', gap: '8px', textAlign: 'right' }}>
                  {at('end').map((column) => (
                    <Fragment key={column.key}>{column.cell(row)}</Fragment>
                  ))}
                </Box>
              </Box>
              <Box
                sx={{
                  display: 'flex',
                  flexWrap: 'wrap',
                  gap: '2px 10px',
                  typography: 'small',
                  color: 'token.ink2',
                }}
              >
                {at('second').map((column) => (
                  <span key={column.key}>{column.cell(row)}</span>
                ))}
              </Box>
            </Box>
            {at('act').map((column) => (
              <Fragment key={column.key}>{column.cell(row)}</Fragment>
            ))}
          </Box>
        ))}
      </Box>
      {footer && <Box sx={{ pt: '8px', typography: 'small', color: 'token.ink2' }}>{footer}</Box>}
    </>
  );
}
