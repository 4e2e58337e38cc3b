import Box from '@mui/material/Box';
import Typography from '@mui/material/Typography';
import type { ReactNode } from 'react';

interface DrawerFormProps {
  label?: string;
  /** 'Kept from 19:46' when an earlier draft filled it. */
  keptFrom: string | undefined;
  onSubmit: () => void;
  children: ReactNode;
}

/** The fields of a drawer one under the other; Enter sends them. */
export function DrawerForm({ label, keptFrom, onSubmit, children }: DrawerFormProps) {
  return (
    <Box
      component="form"
      aria-label={label}
      onSubmit={(event) => {
        event.preventDefault();
        onSubmit();
      }}
      // Under a heading of its own where it has a name, else right under the drawer's title.
      sx={{ display: 'grid', gap: '14px', mt: label ? '12px' : 0 }}
      noValidate
    >
      {keptFrom && (
        <Typography variant="small" role="status">
          {keptFrom}
        </Typography>
      )}
      {children}
      <input type="submit" hidden />
    </Box>
  );
}
