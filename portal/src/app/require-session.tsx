import Box from '@mui/material/Box';
import { Navigate, useLocation } from 'react-router-dom';
import { useClub } from '../api-client/club';
import { useSession } from '../api-client/session';
import { DraftOwner } from '../shared-ui/draft-owner';
import { LoadingBars } from '../shared-ui/loading-bars';
import { ProblemAlert } from '../shared-ui/problem-alert';
import { PageFrame } from './frame/page-frame';
import { useIdleSignOut } from './use-idle-sign-out';

function SignedIn({ personId, isShared }: { personId: string; isShared: boolean }) {
  useIdleSignOut(isShared);
  return (
    <DraftOwner value={personId}>
      <PageFrame />
    </DraftOwner>
  );
}

/**
 * The frame and every page in it, for those who are signed in. Anyone else goes to sign-in and comes back to the
 * same place; what they had typed waits there as a draft.
 */
export function RequireSession() {
  const { me, error, retry } = useSession();
  const club = useClub();
  const { pathname, search } = useLocation();
  if (me && !club.isPending) return <SignedIn key={me.id} personId={me.id} isShared={me.sharedDevice} />;
  if (me === null) return <Navigate to={`/sign-in?next=${encodeURIComponent(pathname + search)}`} replace />;
  return (
    <Box component="main" sx={{ maxWidth: 560, m: '48px auto', px: '16px' }}>
      {error ? <ProblemAlert error={error} onRetry={retry} /> : <LoadingBars label="Opening Ferrite Row" />}
    </Box>
  );
}
