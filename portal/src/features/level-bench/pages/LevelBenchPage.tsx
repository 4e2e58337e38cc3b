import Box from '@mui/material/Box';
import { Link, Navigate, useLocation } from 'react-router-dom';
import { PageTitle } from '../../../shared-ui/page-title';
import { token } from '../../../shared-ui/tokens';
import { usePhone } from '../../../shared-ui/use-phone';
import { FAMILIES, familyPath } from '../frame/families';
import { withWayInNames } from '../readings/ways';

const ROW = {
  display: 'block',
  py: '12px',
  borderBottom: `1px solid ${token('rule')}`,
  color: token('ink'),
  textDecoration: 'none',
} as const;

/** The way in: on a phone the list of families, on a wide screen, where they stand above every page, the readings. */
export default function LevelBenchPage() {
  const isPhone = usePhone();
  const { search } = useLocation();
  // An address with a way of reading in it is from when this was the readings' own page.
  const isReading = new URLSearchParams(search).has('way');
  if (isPhone && !isReading) return <Families />;
  const to = { pathname: familyPath('readings'), search: isReading ? withWayInNames(search) : search };
  return <Navigate to={to} replace />;
}

function Families() {
  return (
    <>
      <PageTitle tab="Level bench">
        Level <b>bench</b>
      </PageTitle>
      <Box
        component="nav"
        aria-label="Families of calculators"
        sx={{ borderTop: `1.5px solid ${token('ink')}` }}
      >
        {FAMILIES.map(({ path, name, about }) => (
          <Box key={path} component={Link} to={familyPath(path)} sx={ROW}>
            <Box component="span" sx={{ display: 'block', fontWeight: 700 }}>
              {name}
            </Box>
            <Box component="span" sx={{ typography: 'small', color: 'token.ink2' }}>
              {about}
            </Box>
          </Box>
        ))}
      </Box>
    </>
  );
}
