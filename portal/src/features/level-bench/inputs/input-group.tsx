import Box from '@mui/material/Box';
import { Children, type ReactNode } from 'react';
import { SectionHeading } from '../../../shared-ui/section-heading';

interface InputGroupProps {
  title: string;
  /** At the right of the heading: where the figures come from. */
  from?: ReactNode;
  children: ReactNode;
}

/** Inputs that belong together, in pairs; wrap one that wants the whole width in `Wide`. */
export function InputGroup({ title, from, children }: InputGroupProps) {
  return (
    <Box component="section" aria-label={title} sx={{ mb: '18px' }}>
      <SectionHeading end={from}>{title}</SectionHeading>
      <Box
        sx={{
          display: 'grid',
          gridTemplateColumns: 'repeat(2, minmax(0, 1fr))',
          alignItems: 'start',
          gap: '10px',
          mt: '10px',
        }}
      >
        {Children.toArray(children)}
      </Box>
    </Box>
  );
}

export const Wide = ({ children }: { children: ReactNode }) => (
  <Box sx={{ gridColumn: '1 / -1' }}>{children}</Box>
);
