import { DataTable } from '../../../shared-ui/data-table';
import type { Column } from '../../../shared-ui/data-table-types';
import { usePhone } from '../../../shared-ui/use-phone';
import { signed } from '../../../lib/text';
import type { PadRow, WorkedPad } from './figures';
import { ohmText, partsText, ratingText, wattText, whereText } from './words';

const COLUMNS: readonly Column<PadRow>[] = [
  {
    key: 'name',
    header: 'Resistor',
    cell: (row) => (
      <>
        {row.name} <span style={{ fontWeight: 400 }}>{whereText(row)}</span>
      </>
    ),
  },
  { key: 'exact', header: 'Exact', align: 'right', cell: ({ exactOhms }) => ohmText(exactOhms) },
  {
    key: 'nearest',
    header: 'Nearest to fit',
    align: 'right',
    phone: 'end',
    cell: (row) => <b>{partsText(row)}</b>,
  },
  {
    key: 'off',
    header: 'Off by',
    align: 'right',
    cell: ({ fitted }) => `${signed(100 * fitted.errorRel, 1)} %`,
  },
  { key: 'heat', header: 'Heat in it', align: 'right', cell: ({ watts }) => wattText(watts) },
  {
    key: 'rating',
    header: 'Rating to buy',
    align: 'right',
    cell: ({ rating, fitted }) =>
      `${ratingText(rating)}${fitted.parts.length > 1 && rating.ratingWatts ? ' each' : ''}`,
  },
];

/** A row on a phone has no headings over it: its figures say themselves what they are. */
const PHONE_WORDS: Record<string, string> = { exact: 'exact', off: 'off by', heat: 'heat', rating: 'rating' };

const PHONE_COLUMNS = COLUMNS.map((column) => {
  const word = PHONE_WORDS[column.key];
  return word
    ? {
        ...column,
        cell: (row: PadRow) => (
          <>
            {word} {column.cell(row)}
          </>
        ),
      }
    : column;
});

/** What to fit, what each takes and what to buy. */
export function PadTable({ worked }: { worked: WorkedPad }) {
  const columns = usePhone() ? PHONE_COLUMNS : COLUMNS;
  return <DataTable label="Resistors" columns={columns} rows={worked.rows} rowKey={({ name }) => name} />;
}
