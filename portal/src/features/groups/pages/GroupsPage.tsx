import Box from '@mui/material/Box';
import { useQuery } from '@tanstack/react-query';
import { EmptyState } from '../../../shared-ui/empty-state';
import { LoadingBars } from '../../../shared-ui/loading-bars';
import { PageTitle } from '../../../shared-ui/page-title';
import { ProblemAlert } from '../../../shared-ui/problem-alert';
import { groupsQuery, type Group } from '../api/groups';
import { GroupCard } from '../components/group-card';

export default function GroupsPage() {
  const groups = useQuery(groupsQuery);
  return (
    <>
      <PageTitle tab="Groups">
        <b>Groups</b>
      </PageTitle>
      {groups.isPending && <LoadingBars rows={6} label="Loading groups" />}
      {groups.isError && <ProblemAlert error={groups.error} onRetry={() => void groups.refetch()} />}
      {groups.data && <GroupList groups={groups.data} />}
    </>
  );
}

function GroupList({ groups }: { groups: Group[] }) {
  if (groups.length === 0)
    return (
      <EmptyState title="No groups yet">Members who build together make a group. Ask a mentor.</EmptyState>
    );
  const [mine, others] = [groups.filter((group) => group.mine), groups.filter((group) => !group.mine)];
  return (
    <>
      {mine.length === 0 && (
        <EmptyState title="You are not in a group yet">
          These are the club’s. Ask a mentor to join one.
        </EmptyState>
      )}
      <Box sx={{ display: 'grid', gridTemplateColumns: { md: 'repeat(3, 1fr)' }, gap: '28px 30px' }}>
        {[...mine, ...others].map((group) => (
          <GroupCard key={group.id} group={group} />
        ))}
      </Box>
    </>
  );
}
