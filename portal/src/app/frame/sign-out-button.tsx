import Button from '@mui/material/Button';
import { useNavigate } from 'react-router-dom';
import { useSignOut } from '../../api-client/session';
import { ProblemAlert } from '../../shared-ui/problem-alert';

export function SignOutButton() {
  const signOut = useSignOut();
  const navigate = useNavigate();
  return (
    <>
      <Button
        fullWidth
        loading={signOut.isPending}
        onClick={() => signOut.mutate(undefined, { onSuccess: () => void navigate('/sign-in') })}
      >
        Sign out
      </Button>
      {signOut.isError && <ProblemAlert error={signOut.error} title="You are still signed in here." />}
    </>
  );
}
