import Box from '@mui/material/Box';
import Divider from '@mui/material/Divider';
import Link from '@mui/material/Link';
import Typography from '@mui/material/Typography';
import { Navigate, useSearchParams } from 'react-router-dom';
import { useClub } from '../../../api-client/club';
import { useSession } from '../../../api-client/session';
import { PageTitle } from '../../../shared-ui/page-title';
import { ClubPanel } from '../components/club-panel';
import { placeToReturnTo } from '../components/place-to-return-to';
import { SignInForm } from '../components/sign-in-form';

export default function SignInPage() {
  const [search] = useSearchParams();
  const { me } = useSession();
  const club = useClub().data;
  if (me) return <Navigate to={placeToReturnTo(search.get('next'))} replace />;
  return (
    <Box sx={{ display: { md: 'flex' }, minHeight: '100dvh' }}>
      <ClubPanel clubName={club?.name ?? ''} />
      <Box
        component="main"
        sx={{
          flex: '1 1 480px',
          display: 'grid',
          alignContent: 'center',
          p: { xs: '20px 16px 32px', md: '32px 48px' },
        }}
      >
        <Box sx={{ width: '100%', maxWidth: 404, mx: 'auto' }}>
          <PageTitle tab="Sign in">Sign in</PageTitle>
          <SignInForm demoAccounts={club?.demoAccounts ?? []} />
          <Divider sx={{ mt: '24px', mb: '14px' }} />
          <Typography variant="small" component="p" sx={{ m: 0, color: 'token.ink2' }}>
            <Box component="b" sx={{ color: 'token.ink' }}>
              New to the club?
            </Box>{' '}
            An organiser sends your invitation.
            {club && (
              <>
                {' '}
                Write to <Link href={`mailto:${club.contactEmail}`}>{club.contactEmail}</Link>.
              </>
            )}
          </Typography>
        </Box>
      </Box>
    </Box>
  );
}
