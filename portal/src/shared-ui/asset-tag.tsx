import Box from '@mui/material/Box';

/** An instrument's tag, always text so that it can be copied and searched: `<AssetTag>FR-021</AssetTag>`. */
export function AssetTag({ children }: { children: string }) {
  return (
    <Box
      component="span"
      sx={{
        typography: 'tag',
        display: 'inline-block',
        px: '5px',
        border: '1px solid',
        borderColor: 'token.edge',
        borderRadius: '2px',
        color: 'token.ink2',
        backgroundColor: 'token.sheet',
        whiteSpace: 'nowrap',
      }}
    >
      {children}
    </Box>
  );
}
