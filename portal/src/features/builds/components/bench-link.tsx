import Link from '@mui/material/Link';
import Typography from '@mui/material/Typography';
import { Link as RouterLink } from 'react-router-dom';

/** The same calculation on the level bench, its inputs in the address; nothing where there is none. */
export function BenchLink({ to }: { to: string | undefined }) {
  if (!to) return null;
  return (
    <Typography variant="small" component="p" sx={{ m: 0, mt: '10px' }}>
      <Link component={RouterLink} to={to}>
        Open in Level bench
      </Link>
    </Typography>
  );
}
