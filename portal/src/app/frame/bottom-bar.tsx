import Box from '@mui/material/Box';
import ButtonBase from '@mui/material/ButtonBase';
import { Link, useLocation } from 'react-router-dom';
import { Icon } from '../../shared-ui/icon';
import { token } from '../../shared-ui/tokens';
import { BOTTOM_PATHS, isAt, OWN_PAGES } from '../pages';
import { BOTTOM_BAR } from '../../shared-ui/bottom-bar-height';

const cell = (isHere: boolean) => ({
  display: 'flex',
  flexDirection: 'column',
  alignItems: 'center',
  justifyContent: 'center',
  gap: '3px',
  flex: '1 1 0',
  minWidth: 0,
  height: BOTTOM_BAR,
  color: isHere ? 'token.ink' : 'token.ink2',
  backgroundColor: isHere ? 'token.paper' : 'transparent',
  boxShadow: isHere ? `inset 0 3px 0 ${token('green')}` : 'none',
  fontSize: '0.71875rem',
  lineHeight: '1rem',
  fontWeight: isHere ? 700 : 400,
  textDecoration: 'none',
  whiteSpace: 'nowrap',
  '& svg': { color: isHere ? 'token.green' : 'token.ink3' },
});

interface BottomBarProps {
  isMoreOpen: boolean;
  onMore: () => void;
}

/** The phone's five: four pages and More. */
export function BottomBar({ isMoreOpen, onMore }: BottomBarProps) {
  const { pathname } = useLocation();
  const isOther = !BOTTOM_PATHS.some((path) => isAt(path, pathname));
  return (
    <Box
      component="nav"
      aria-label="Pages"
      data-frame
      sx={{
        display: { xs: 'flex', md: 'none' },
        position: 'fixed',
        zIndex: 'tooltip',
        insetInline: 0,
        bottom: 0,
        pb: 'env(safe-area-inset-bottom)',
        borderTop: '1px solid',
        borderColor: 'token.rule',
        backgroundColor: 'token.sunk',
        '@media print': { display: 'none' },
      }}
    >
      {OWN_PAGES.filter(({ path }) => BOTTOM_PATHS.includes(path)).map((page) => {
        const isHere = !isMoreOpen && isAt(page.path, pathname);
        return (
          <Box
            key={page.path}
            component={Link}
            to={page.path}
            aria-current={isHere ? 'page' : undefined}
            sx={cell(isHere)}
          >
            <Icon name={page.icon} size={20} />
            {page.words}
          </Box>
        );
      })}
      <ButtonBase
        aria-haspopup="dialog"
        aria-expanded={isMoreOpen}
        onClick={onMore}
        sx={cell(isMoreOpen || isOther)}
      >
        <Icon name="more" size={20} />
        More
      </ButtonBase>
    </Box>
  );
}
