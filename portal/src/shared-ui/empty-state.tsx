import Box from '@mui/material/Box';
import Typography from '@mui/material/Typography';
import type { ReactNode } from 'react';

interface EmptyStateProps {
  title: string;
  /** What to do next. */
  children?: ReactNode;
  action?: ReactNode;
}

/** Nothing here yet, and the first thing to do about it. */
export function EmptyState({ title, children, action }: EmptyStateProps) {
  return (
    <Box
      sx={{
        my: '12px',
        p: '14px 16px',
        border: '1px solid',
        borderColor: 'token.rule',
        borderRadius: '3px',
        backgroundColor: 'token.sheet',
      }}
    >
      <Typography variant="value" component="p" sx={{ fontWeight: 700, m: 0 }}>
        {title}
      </Typography>
      {children && (
        <Typography variant="small" component="div" sx={{ color: 'token.ink2' }}>
          {children}
        </Typography>
      )}
      {action && <Box sx={{ mt: '10px' }}>{action}</Box>}
    </Box>
  );
}
