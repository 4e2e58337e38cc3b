import Box from '@mui/material/Box';

interface CountMarkProps {
  count: number;
  /** An outlined count only informs; a copper one needs the person. */
  informs?: boolean;
}

export function CountMark({ count, informs = false }: CountMarkProps) {
  return (
    <Box
      component="span"
      sx={{
        flex: 'none',
        display: 'inline-grid',
        placeItems: 'center',
        minWidth: 20,
        height: 20,
        px: '5px',
        borderRadius: '10px',
        border: '1px solid',
        borderColor: informs ? 'token.edge' : 'token.copper',
        backgroundColor: informs ? 'transparent' : 'token.copper',
        color: informs ? 'token.ink2' : 'token.paper',
        fontSize: '0.71875rem',
        lineHeight: 1,
        fontWeight: 700,
      }}
    >
      {count}
    </Box>
  );
}
