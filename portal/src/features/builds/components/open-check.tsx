import Box from '@mui/material/Box';
import Link from '@mui/material/Link';
import Typography from '@mui/material/Typography';
import type { ReactNode } from 'react';
import { Link as RouterLink } from 'react-router-dom';
import type { BuildCheck, BuildStage } from '../api/builds';
import { usePhone } from '../../../shared-ui/use-phone';
import type { ReadingFormState } from '../logic/use-reading-form';
import { gainAddress } from '../logic/bench-address';
import { sourcesOf } from '../logic/stage';
import { windowText } from '../logic/words';
import { BenchLink } from './bench-link';
import { AllCautions, GraveCautions } from './caution-ticks';
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
      {check.instrumentKindId && !check.isSettled && (
        <Typography variant="small" component="p" sx={{ mt: 0, mb: '12px' }}>
          <Link component={RouterLink} to={bookPath(check)}>
            Book a bench and instrument for this
          </Link>
        </Typography>
      )}
      <Body {...{ buildId, stage, check, form, testPoint, onDone }} />
    </Box>
  );
}

/** The bench book with the check and its kind of instrument filled in. */
const bookPath = ({ id, instrumentKindId }: BuildCheck): string =>
  `/bench-book?${new URLSearchParams({ check: id, need: instrumentKindId ?? '' }).toString()}`;

function Body({ buildId, stage, check, form, testPoint, onDone }: OpenCheckProps) {
  const isPhone = usePhone();
  if (form.fields.length > 0) return <ReadingCard form={form} stage={stage} testPoint={testPoint} />;
  // On a wide screen the milder ones stand under the diagram beside it.
  const Cautions = isPhone ? AllCautions : GraveCautions;
  return (
    <>
      <Cautions cautions={stage.cautions} />
      {check.kind === 'photo' && <PhotoCard buildId={buildId} check={check} />}
      {(check.kind === 'tick' || check.kind === 'safety') && (
        <TickCard buildId={buildId} check={check} onDone={onDone} />
      )}
      {check.kind === 'measure' && <Tries check={check} />}
      {check.kind === 'measure' && <BenchLink to={gainAddress(check, sourcesOf(check, stage))} />}
    </>
  );
}
