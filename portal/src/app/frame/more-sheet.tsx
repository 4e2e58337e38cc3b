import Box from '@mui/material/Box';
import Button from '@mui/material/Button';
import Drawer from '@mui/material/Drawer';
import Typography from '@mui/material/Typography';
import { Link } from 'react-router-dom';
import { useMe } from '../../api-client/session';
import { PersonMark } from '../../shared-ui/person-mark';
import { ThemeChoice } from '../../shared-ui/theme-choice';
import { token } from '../../shared-ui/tokens';
import { BOTTOM_PATHS, OWN_PAGES, ROLE_PAGES } from '../pages';
import { useMoreNews } from '../more-news';
import { useRailCounts } from '../rail-counts';
import { MoreRow } from './more-row';
import { SignOutButton } from './sign-out-button';

interface MoreSheetProps {
  open: boolean;
  onClose: () => void;
}

const Heading = ({ children }: { children: string }) => (
  <Typography variant="label" component="h2" sx={{ m: 0, pt: '12px', pb: '4px', color: 'token.ink3' }}>
    {children}
  </Typography>
);

/** The rest of the pages on a phone, role pages under the role's name, the theme, the person and sign-out. */
export function MoreSheet({ open, onClose }: MoreSheetProps) {
  const me = useMe();
  const counts = useRailCounts();
  const news = useMoreNews(open);
  const rest = OWN_PAGES.filter(({ path }) => !BOTTOM_PATHS.includes(path));
  const also = me.roles.filter((role) => role !== 'member');
  return (
    <Drawer
      open={open}
      onClose={onClose}
      anchor="bottom"
      slotProps={{
        paper: {
          'aria-label': 'More',
          sx: {
            bottom: 62,
            maxHeight: 'calc(100dvh - 120px)',
            p: '9px 16px 12px',
            borderTop: `1.5px solid ${token('ink')}`,
            borderRadius: '10px 10px 0 0',
          },
        },
      }}
    >
      <Box
        sx={{
          flex: 'none',
          width: 40,
          height: 4,
          m: '0 auto 6px',
          borderRadius: 2,
          backgroundColor: 'token.edge',
        }}
      />
      {rest.map((page) => (
        <MoreRow
          key={page.path}
          page={page}
          news={counts[page.path] ?? { news: news[page.path] }}
          onClick={onClose}
        />
      ))}
      {ROLE_PAGES.filter(({ role }) => me.hasRole(role)).map(({ role, words, pages }) => (
        <Box key={role}>
          <Heading>{words}</Heading>
          {pages.map((page) => (
            <MoreRow key={page.path} page={page} news={counts[page.path]} onClick={onClose} />
          ))}
        </Box>
      ))}
      <Heading>This device</Heading>
      <ThemeChoice device="phone" />
      <Box sx={{ display: 'flex', alignItems: 'center', gap: '11px', py: '12px' }}>
        <PersonMark name={me.name} size={34} />
        <Box sx={{ flex: 1, minWidth: 0 }}>
          <Typography variant="h3" component="p" sx={{ m: 0 }}>
            {me.name}
          </Typography>
          <Typography variant="small" sx={{ color: 'token.ink2' }}>
            {['Member', ...also].join(', ')}
          </Typography>
        </Box>
        <Button component={Link} to="/you" onClick={onClose}>
          You
        </Button>
      </Box>
      <SignOutButton />
    </Drawer>
  );
}
