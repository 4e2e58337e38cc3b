import Box from '@mui/material/Box';

/** First on every page; shows itself when it has the focus. */
export function SkipLink() {
  return (
    <Box
      component="a"
      href="#main"
      sx={{
        position: 'fixed',
        zIndex: 'tooltip',
        top: 8,
        left: 8,
        p: '12px 16px',
        border: '1.5px solid',
        borderColor: 'token.ink',
        borderRadius: '3px',
        backgroundColor: 'token.sheet',
        color: 'token.green',
        fontWeight: 700,
        '&:not(:focus)': { transform: 'translateY(-200%)' },
      }}
    >
      Skip to the page
    </Box>
  );
}
