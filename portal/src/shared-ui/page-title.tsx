import Box from '@mui/material/Box';
import Typography from '@mui/material/Typography';
import { useEffect, type ReactNode } from 'react';

interface PageTitleProps {
  /** Plain text for the browser's tab: "Stage 9 Pre-driver". */
  tab: string;
  /** The light part, then `<b>` for the noun: `<>Stage 9 <b>Pre-driver</b></>`. */
  children: ReactNode;
  /** A line above: a way back, or the series a night belongs to. */
  over?: ReactNode;
  /** Beside the title: a state, a line of where and when. */
  beside?: ReactNode;
  /** Buttons at the right; under the title on a phone. */
  actions?: ReactNode;
}

/** The page's one `h1`, and the browser tab's title. */
export function PageTitle({ tab, children, over, beside, actions }: PageTitleProps) {
  useEffect(() => {
    document.title = `${tab} · Ferrite Row`;
  }, [tab]);
  return (
    <Box sx={{ display: 'flex', flexWrap: 'wrap', alignItems: 'flex-end', gap: '8px 20px', mb: '12px' }}>
      <Box sx={{ minWidth: 0, flex: '1 1 auto' }}>
        {over && <Typography variant="small" component="div" sx={{ color: 'token.ink2' }} children={over} />}
        <Box sx={{ display: 'flex', flexWrap: 'wrap', alignItems: 'baseline', gap: '0 16px' }}>
          <Typography variant="h1">{children}</Typography>
          {beside}
        </Box>
      </Box>
      {actions && <Box sx={{ display: 'flex', flexWrap: 'wrap', gap: '8px' }}>{actions}</Box>}
    </Box>
  );
}
