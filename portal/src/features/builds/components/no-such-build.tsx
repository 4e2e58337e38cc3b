import Button from '@mui/material/Button';
import { Link } from 'react-router-dom';
import { ProblemError } from '../../../api-client/problem-error';
import { EmptyState } from '../../../shared-ui/empty-state';
import { PageTitle } from '../../../shared-ui/page-title';
import { PhoneBar } from '../../../shared-ui/phone-bar';
import { ProblemAlert } from '../../../shared-ui/problem-alert';

/** A link that leads nowhere, or to a build one may not see; trying again would not help. */
const isDeadLink = (error: Error): boolean =>
  error instanceof ProblemError && [400, 403, 404, 422].includes(error.status);

/** In place of a build that did not open: says why, with the way on. */
export function BuildProblem({ error, onRetry }: { error: Error; onRetry: () => void }) {
  return (
    <>
      <PhoneBar title="My build" backTo="/" backLabel="Back to Tonight" />
      <PageTitle tab="My build">
        My <b>build</b>
      </PageTitle>
      {isDeadLink(error) ? (
        <EmptyState
          title="There is no such build here"
          action={
            <Button component={Link} to="/build" variant="contained">
              Open my build
            </Button>
          }
        >
          The link is wrong or old, or the build is not shared with you. Its owner can say.
        </EmptyState>
      ) : (
        <ProblemAlert error={error} onRetry={onRetry} />
      )}
    </>
  );
}

/** The build is there, the stage in the link is not. */
export function NoSuchStage({ buildId, currentStageId }: { buildId: string; currentStageId: string | null }) {
  const to = currentStageId ? `/build/${buildId}/stages/${currentStageId}` : '/build';
  return (
    <>
      <PhoneBar title="My build" backTo="/" backLabel="Back to Tonight" />
      <PageTitle tab="My build">
        My <b>build</b>
      </PageTitle>
      <EmptyState
        title="This build has no such stage"
        action={
          <Button component={Link} to={to} variant="contained">
            Open the current stage
          </Button>
        }
      >
        The link is wrong or old. Nothing in the build has changed.
      </EmptyState>
    </>
  );
}
