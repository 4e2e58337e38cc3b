import Box from '@mui/material/Box';
import { Link } from 'react-router-dom';
import { useMe } from '../../api-client/session';
import { PersonMark } from '../../shared-ui/person-mark';
import { Brand } from './brand';

/** The phone's header; an inner page puts its own bar into the slot, and the product's name gives way. */
export function PhoneHeader({ slotRef }: { slotRef: (element: HTMLElement | null) => void }) {
  const me = useMe();
  return (
    <Box
      component="header"
      sx={{
        display: { xs: 'flex', md: 'none' },
        alignItems: 'center',
        justifyContent: 'space-between',
        minHeight: 52,
        px: '16px',
        borderBottom: '1px solid',
        borderColor: 'token.rule',
        backgroundColor: 'token.sunk',
        '& .bar:not(:empty) ~ *': { display: 'none' },
        '@media print': { display: 'none' },
      }}
    >
      <Box
        className="bar"
        ref={slotRef}
        sx={{ width: '100%', minWidth: 0, '&:empty': { display: 'none' } }}
      />
      <Brand />
      <Box
        component={Link}
        to="/you"
        aria-label={`You, ${me.name}`}
        sx={{
          display: 'grid',
          placeItems: 'center',
          minWidth: 44,
          minHeight: 44,
          mr: '-6px',
          textDecoration: 'none',
        }}
      >
        <PersonMark name={me.name} size={30} />
      </Box>
    </Box>
  );
}
