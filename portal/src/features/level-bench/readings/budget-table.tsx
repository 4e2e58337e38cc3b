import { fixed } from '../../../lib/text';
import { DataTable } from '../../../shared-ui/data-table';
import type { BudgetRow } from './words';

/** Each source of uncertainty with its limit and what it adds. */
export const BudgetTable = ({ rows }: { rows: readonly BudgetRow[] }) => (
  <DataTable<BudgetRow>
    label="Uncertainty budget"
    columns={[
      { key: 'name', header: 'Source', cell: ({ name }) => name },
      { key: 'limit', header: 'Limit', cell: ({ limit }) => limit, align: 'right' },
      {
        key: 'distribution',
        header: 'Distribution',
        cell: ({ distribution }) => distribution,
        align: 'right',
      },
      { key: 'standard', header: 'Standard', cell: ({ standard }) => standard, align: 'right' },
      {
        key: 'share',
        header: 'Share',
        cell: ({ share }) => `${fixed(share, 0)} %`,
        align: 'right',
        phone: 'end',
      },
    ]}
    rows={rows}
    rowKey={({ name }) => name}
    footer="The squares of the standard parts added, the root taken, times two (k = 2, about 95 %)."
  />
);
