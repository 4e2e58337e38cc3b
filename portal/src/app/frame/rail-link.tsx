import Box from '@mui/material/Box';
import { Link, useLocation } from 'react-router-dom';
import { CountMark } from '../../shared-ui/count-mark';
import { Icon } from '../../shared-ui/icon';
import { VisuallyHidden } from '../../shared-ui/visually-hidden';
import { token } from '../../shared-ui/tokens';
import type { PageLink } from '../pages';
import { isAt } from '../pages';
import type { RailCount } from '../rail-counts';

const HERE = {
  backgroundColor: 'token.paper',
  borderColor: 'token.rule',
  boxShadow: `inset 3px 0 0 ${token('green')}`,
  color: 'token.ink',
  fontWeight: 700,
  '& svg': { color: 'token.green' },
};

export function RailLink({ page, news }: { page: PageLink; news?: RailCount }) {
  const isHere = isAt(page.path, useLocation().pathname);
  return (
    <Box
      component={Link}
      to={page.path}
      aria-current={isHere ? 'page' : undefined}
      sx={{
        display: 'flex',
        alignItems: 'center',
        gap: '9px',
        height: 37,
        pl: '20px',
        pr: '14px',
        borderTop: '1px solid transparent',
        borderBottom: '1px solid transparent',
        color: 'token.ink2',
        fontSize: '0.84375rem',
        textDecoration: 'none',
        '& svg': { color: 'token.ink3' },
        '&:hover': { color: 'token.ink' },
        '@media (pointer: coarse)': { height: 44 },
        ...(isHere && HERE),
      }}
    >
      <Icon name={page.icon} size={20} />
      <Box component="span" sx={{ flex: 1 }}>
        {page.words}
      </Box>
      {news?.count ? (
        <>
          <CountMark count={news.count} />
          <VisuallyHidden>{news.count === 1 ? ' needs you' : ' need you'}</VisuallyHidden>
        </>
      ) : null}
    </Box>
  );
}
