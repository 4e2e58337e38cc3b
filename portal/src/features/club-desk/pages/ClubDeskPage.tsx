import Box from '@mui/material/Box';
import { useQuery } from '@tanstack/react-query';
import { useSearchParams } from 'react-router-dom';
import { capital, listText } from '../../../lib/text';
import { DataTable } from '../../../shared-ui/data-table';
import { EmptyState } from '../../../shared-ui/empty-state';
import { TextField } from '../../../shared-ui/fields/text-field';
import { LoadingBars } from '../../../shared-ui/loading-bars';
import { PageTitle } from '../../../shared-ui/page-title';
import { ProblemAlert } from '../../../shared-ui/problem-alert';
import { peopleQuery, type Person } from '../api/people';

const rolesText = ({ roles }: Person): string => capital(listText(roles));

/** Who may do what: everybody of the club and the roles they hold. */
export default function ClubDeskPage() {
  const [search, setSearch] = useSearchParams();
  const name = search.get('name') ?? '';
  const people = useQuery(peopleQuery(name.trim()));
  const look = (text: string) => setSearch(text ? { name: text } : {}, { replace: true });
  return (
    <>
      <PageTitle tab="Club desk">
        Club <b>desk</b>
      </PageTitle>
      <Box sx={{ maxWidth: 320, my: '14px' }}>
        <TextField label="Name" value={name} onChange={look} />
      </Box>
      {people.isPending && <LoadingBars rows={8} label="Loading people" />}
      {people.isError && <ProblemAlert error={people.error} onRetry={() => void people.refetch()} />}
      {people.data?.total === 0 && (
        <EmptyState title="Nobody of that name">Clear the name to see everybody.</EmptyState>
      )}
      {people.data && people.data.total > 0 && (
        <DataTable
          label="People and their roles"
          columns={[
            { key: 'name', header: 'Person', cell: (person) => <b>{person.name}</b> },
            { key: 'roles', header: 'Roles', cell: rolesText },
          ]}
          rows={people.data.items}
          rowKey={({ id }) => id}
          footer={`${people.data.total} people`}
        />
      )}
    </>
  );
}
