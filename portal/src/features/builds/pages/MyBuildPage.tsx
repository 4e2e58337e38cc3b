import { useQuery } from '@tanstack/react-query';
import Button from '@mui/material/Button';
import { Navigate } from 'react-router-dom';
import { EmptyState } from '../../../shared-ui/empty-state';
import { LoadingBars } from '../../../shared-ui/loading-bars';
import { PageTitle } from '../../../shared-ui/page-title';
import { ProblemAlert } from '../../../shared-ui/problem-alert';
import { plansQuery, useMyBuilds, useStartBuild } from '../api/builds';
import { checkPath } from '../logic/stage';

/** Leads to the stage one is on; where there is no build yet, offers the plans to begin one from. */
export default function MyBuildPage() {
  const builds = useMyBuilds();
  const [build] = builds.data ?? [];
  if (build?.currentStageId) return <Navigate to={checkPath(build.id, build.currentStageId)} replace />;
  return (
    <>
      <PageTitle tab="My build">
        My <b>build</b>
      </PageTitle>
      {builds.isPending && <LoadingBars rows={6} label="Opening your build" />}
      {builds.isError && <ProblemAlert error={builds.error} onRetry={() => void builds.refetch()} />}
      {builds.isSuccess && <Plans />}
    </>
  );
}

function Plans() {
  const plans = useQuery(plansQuery);
  const starting = useStartBuild();
  if (plans.isPending) return <LoadingBars rows={2} label="Looking for plans" />;
  if (plans.isError) return <ProblemAlert error={plans.error} onRetry={() => void plans.refetch()} />;
  const offered = plans.data.items.filter(({ editions }) => editions.length > 0);
  return (
    <>
      {starting.isError && <ProblemAlert title="The build was not begun." error={starting.error} />}
      {offered.length === 0 && (
        <EmptyState title="No build yet">A mentor has to publish a plan first.</EmptyState>
      )}
      {offered.map(({ id, name, summary }) => (
        <EmptyState
          key={id}
          title={`Build a ${name}`}
          action={
            <Button variant="contained" loading={starting.isPending} onClick={() => starting.mutate(id)}>
              Begin stage 1
            </Button>
          }
        >
          {summary}
        </EmptyState>
      ))}
    </>
  );
}
