import Box from '@mui/material/Box';
import Typography from '@mui/material/Typography';
import { Link } from 'react-router-dom';
import { useClub } from '../../api-client/club';
import { Mark } from '../../shared-ui/mark';

/** The product's mark and name over the club's; leads to Tonight. */
export function Brand({ withClub = false }: { withClub?: boolean }) {
  const club = useClub().data;
  return (
    <Box
      component={Link}
      to="/"
      aria-label="Ferrite Row, Tonight"
      className="brand"
      sx={{
        display: 'flex',
        alignItems: 'center',
        gap: '10px',
        color: 'token.ink',
        textDecoration: 'none',
        minHeight: 44,
      }}
    >
      <Mark width={withClub ? 42 : 34} />
      <Box sx={{ minWidth: 0 }}>
        <Typography
          component="span"
          sx={{ display: 'block', fontSize: '1rem', lineHeight: '1.25rem', fontWeight: 700 }}
        >
          Ferrite Row
        </Typography>
        {withClub && (
          <Typography
            variant="least"
            component="span"
            noWrap
            sx={{ display: 'block', fontWeight: 400, color: 'token.ink2' }}
          >
            {club?.name ?? '\u00a0'}
          </Typography>
        )}
      </Box>
    </Box>
  );
}
