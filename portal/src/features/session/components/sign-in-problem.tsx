import { ProblemError } from '../../../api-client/problem-error';
import { Banner } from '../../../shared-ui/banner';
import { ProblemAlert } from '../../../shared-ui/problem-alert';

/** Why the sign-in did not happen, and what was kept. */
export function SignInProblem({ error }: { error: unknown }) {
  if (error instanceof ProblemError && error.status === 0) {
    return (
      <Banner kind="no connection" title="No connection.">
        A tablet that is signed in still opens. Your email is kept; try again when the connection returns.
      </Banner>
    );
  }
  if (error instanceof ProblemError && error.is('wrong-email-or-password')) {
    return (
      <Banner kind="failed" title="That email and password do not match.">
        Your email is kept.
      </Banner>
    );
  }
  return <ProblemAlert error={error} />;
}
