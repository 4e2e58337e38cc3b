import Box from '@mui/material/Box';
import Typography from '@mui/material/Typography';
import { Link } from 'react-router-dom';
import { CountMark } from '../../shared-ui/count-mark';
import { Icon } from '../../shared-ui/icon';
import type { PageLink } from '../pages';
import type { RailCount } from '../rail-counts';

interface MoreRowProps {
  page: PageLink;
  news?: RailCount;
  onClick: () => void;
}

/** One page in the More sheet, 46 high, with its news in words. */
export function MoreRow({ page, news, onClick }: MoreRowProps) {
  return (
    <Box
      component={Link}
      to={page.path}
      onClick={onClick}
      sx={{
        display: 'flex',
        alignItems: 'center',
        gap: '11px',
        minHeight: 46,
        borderBottom: '1px solid',
        borderColor: 'token.rule',
        color: 'token.ink',
        textDecoration: 'none',
        '& svg': { color: 'token.ink3' },
      }}
    >
      <Icon name={page.icon} size={19} />
      <Typography component="span" sx={{ flex: 1, fontSize: '0.9375rem', fontWeight: 600 }}>
        {page.words}
      </Typography>
      {news?.count ? (
        <CountMark count={news.count} />
      ) : (
        <Typography variant="small" sx={{ color: 'token.ink2' }}>
          {news?.news}
        </Typography>
      )}
    </Box>
  );
}
