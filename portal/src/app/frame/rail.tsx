import Box from '@mui/material/Box';
import Typography from '@mui/material/Typography';
import { useMe } from '../../api-client/session';
import { token } from '../../shared-ui/tokens';
import { OWN_PAGES, ROLE_PAGES } from '../pages';
import { useRailCounts } from '../rail-counts';
import { Brand } from './brand';
import { PersonBlock } from './person-block';
import { RailLink } from './rail-link';

/** The left rail, 900 px and wider: the person's own jobs, then each role's pages under its name. */
export function Rail({ onKeys }: { onKeys: () => void }) {
  const me = useMe();
  const counts = useRailCounts();
  return (
    <Box
      component="nav"
      aria-label="Pages"
      data-frame
      sx={{
        display: { xs: 'none', md: 'flex' },
        flexDirection: 'column',
        position: 'sticky',
        top: 0,
        flex: 'none',
        width: 220,
        height: '100dvh',
        overflowY: 'auto',
        // An inset line and not a border: the chosen entry paints over it and so joins the page.
        boxShadow: `inset -1px 0 0 ${token('rule')}`,
        backgroundColor: 'token.sunk',
        '@media print': { display: 'none' },
      }}
    >
      <Box sx={{ flex: 'none', display: 'flex', alignItems: 'center', height: 76, pl: '18px', pr: '8px' }}>
        <Brand withClub />
      </Box>
      <Box sx={{ flex: 1 }}>
        {OWN_PAGES.map((page) => (
          <RailLink key={page.path} page={page} news={counts[page.path]} />
        ))}
        {ROLE_PAGES.filter(({ role }) => me.hasRole(role)).map(({ role, words, pages }) => (
          <Box key={role} role="group" aria-labelledby={`rail-${role}`}>
            <Typography
              variant="least"
              component="h2"
              id={`rail-${role}`}
              sx={{ m: 0, p: '16px 20px 6px', color: 'token.ink3' }}
            >
              {words}
            </Typography>
            {pages.map((page) => (
              <RailLink key={page.path} page={page} news={counts[page.path]} />
            ))}
          </Box>
        ))}
      </Box>
      <PersonBlock onKeys={onKeys} />
    </Box>
  );
}
