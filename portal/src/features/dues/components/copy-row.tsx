import Box from '@mui/material/Box';
import Button from '@mui/material/Button';
import { useState, type ReactNode } from 'react';
import { VisuallyHidden } from '../../../shared-ui/visually-hidden';

interface CopyRowProps {
  label: string;
  children: ReactNode;
  /** What goes to the clipboard: without the spaces that are there for the eye. Left out, there is nothing to copy. */
  copies?: string;
  /** The one that matters most: tinted, and its button filled. */
  isMain?: boolean;
}

/** One value of a transfer with its own Copy. */
export function CopyRow({ label, children, copies, isMain = false }: CopyRowProps) {
  const [words, setWords] = useState('');
  const copy = async (text: string) => {
    try {
      await navigator.clipboard.writeText(text);
      setWords('Copied');
    } catch {
      setWords('Not copied: mark the text and copy it by hand');
    }
  };
  return (
    <Box
      sx={{
        display: 'grid',
        gridTemplateColumns: { xs: '74px 1fr auto', md: '100px 1fr auto' },
        alignItems: 'center',
        gap: { xs: '8px', md: '12px' },
        minHeight: { xs: 52, md: 44 },
        mx: isMain ? { xs: '-16px', md: '-20px' } : 0,
        px: isMain ? { xs: '16px', md: '20px' } : 0,
        py: isMain ? '8px' : '4px',
        backgroundColor: isMain ? 'token.greenTint' : undefined,
        borderBottom: isMain ? 0 : '1px solid',
        borderColor: 'token.rule',
      }}
    >
      <Box sx={{ color: isMain ? 'token.green' : 'token.ink2', fontWeight: isMain ? 700 : 400 }}>{label}</Box>
      <Box sx={{ minWidth: 0, fontWeight: 700, fontSize: { xs: '0.8125rem', md: '0.875rem' } }}>
        {children}
      </Box>
      {copies && (
        <Button
          size="small"
          variant={isMain ? 'contained' : 'outlined'}
          aria-label={`Copy ${label.toLowerCase()}`}
          onClick={() => void copy(copies)}
        >
          {words === 'Copied' ? 'Copied' : 'Copy'}
        </Button>
      )}
      <VisuallyHidden>
        <span role="status">{words}</span>
      </VisuallyHidden>
    </Box>
  );
}
