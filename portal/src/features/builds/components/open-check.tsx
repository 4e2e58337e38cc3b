import Box from '@mui/material/Box';
import Typography from '@mui/material/Typography';
import type { ReactNode } from 'react';
import type { BuildCheck, BuildStage } from '../api/builds';
import type { ReadingFormState } from '../logic/use-reading-form';
import { windowText } from '../logic/words';
import { PhotoCard } from './photo-card';
import { ReadingCard } from './reading-card';
import { TickCard } from './tick-card';
import { Tries } from './tries';

export interface OpenCheckProps {
  buildId: string;
  stage: BuildStage;
  check: BuildCheck;
  form: ReadingFormState;
  testPoint?: string;
  onDone: () => void;
  /** At the right of the heading on a phone: the way to the level diagram. */
  aside?: ReactNode;
}

/** The one check that is open: its name, its window, what to do, and the form its kind asks for. */
export function OpenCheck({ buildId, stage, check, form, testPoint, onDone, aside }: OpenCheckProps) {
  const window = windowText(check);
  return (
    <Box
      component="section"
      aria-label={`Check ${check.position}, ${check.title}`}
      sx={{
        border: { md: '1.5px solid' },
        borderColor: { md: 'token.ink' },
        borderRadius: '3px',
        backgroundColor: { md: 'token.sheet' },
        mx: { md: '-14px' },
        p: { xs: 0, md: '14px' },
      }}
    >
      <Box
        sx={{
          display: 'flex',
          flexWrap: 'wrap',
          justifyContent: 'space-between',
          gap: '2px 12px',
          mb: '8px',
        }}
      >
        <Typography variant="h2" component="h3" sx={{ fontSize: { xs: '1.125rem', md: '0.9375rem' } }}>
          {check.position} {check.title}
        </Typography>
        {aside}
        {window && (
          <Typography
            variant="small"
            component="p"
            sx={{ m: 0, width: { xs: '100%', md: 'auto' }, color: 'token.ink2' }}
          >
            Window <b>{window}</b>
          </Typography>
        )}
      </Box>
      {check.instruction && (
        <Typography variant="small" component="p" sx={{ mt: 0, mb: '12px', color: 'token.ink2' }}>
          {check.instruction}
        </Typography>
      )}
      <Body {...{ buildId, stage, check, form, testPoint, onDone }} />
    </Box>
  );
}

function Body({ buildId, stage, check, form, testPoint, onDone }: OpenCheckProps) {
  if (check.kind === 'photo') return <PhotoCard buildId={buildId} check={check} />;
  if (check.kind === 'tick' || check.kind === 'safety')
    return <TickCard buildId={buildId} check={check} onDone={onDone} />;
  if (form.fields.length > 0) return <ReadingCard form={form} stage={stage} testPoint={testPoint} />;
  return <Tries check={check} />;
}
