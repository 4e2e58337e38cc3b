import Button from '@mui/material/Button';
import { useNavigate } from 'react-router-dom';
import { useSignOut } from '../../api-client/session';
import { ProblemAlert } from '../../shared-ui/problem-alert';

export function SignOutButton() {
  const signOut = useSignOut();
  const navigate = useNavigate();
  // Not through the mutation's own callbacks: the frame and this button are gone by the time they would run.
  const leave = () =>
    void signOut.mutateAsync().then(
      () => navigate('/sign-in', { replace: true }),
      () => undefined,
    );
  return (
    <>
      <Button fullWidth loading={signOut.isPending} onClick={leave}>
        Sign out
      </Button>
      {signOut.isError && <ProblemAlert error={signOut.error} title="You are still signed in here." />}
    </>
  );
}
