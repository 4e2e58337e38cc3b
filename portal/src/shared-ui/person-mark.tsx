import Box from '@mui/material/Box';
import { initials } from '../lib/text';

interface PersonMarkProps {
  name: string;
  size?: number;
}

/** A person's initials in a ring; decoration beside the name. */
export function PersonMark({ name, size = 28 }: PersonMarkProps) {
  return (
    <Box
      component="span"
      aria-hidden
      sx={{
        flex: 'none',
        display: 'inline-grid',
        placeItems: 'center',
        width: size,
        height: size,
        borderRadius: '50%',
        border: '1px solid',
        borderColor: 'token.edge',
        backgroundColor: 'token.sheet',
        color: 'token.ink2',
        fontFamily: 'fontFamily',
        fontSize: size >= 28 ? '0.6875rem' : '0.625rem',
        fontWeight: 700,
      }}
    >
      {initials(name)}
    </Box>
  );
}
