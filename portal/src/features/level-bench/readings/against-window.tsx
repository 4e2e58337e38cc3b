import Box from '@mui/material/Box';
import { SectionHeading } from '../../../shared-ui/section-heading';
import { VerdictChip } from '../../../shared-ui/states/verdict-chip';
import { WindowBar } from '../../../shared-ui/window-bar';
import { figureOf, windowText } from './words';
import type { WorkedReading } from './work';

/** The window in the unit the figures beside it are in. */
function scaled({ window, reading }: WorkedReading) {
  const scale = reading.unit === 'Hz' ? 1000 : 1;
  const by = (value?: number) => (value === undefined ? undefined : value / scale);
  return {
    low: by(window?.low),
    high: by(window?.high),
    target: by(window?.target),
    reading: { value: reading.value / scale, expandedUncertainty: reading.expandedUncertainty / scale },
  };
}

/** Verdict, why it is too close to call, and the window on its line. */
export function AgainstWindow({ worked }: { worked: WorkedReading }) {
  const { verdict, advice, reading } = worked;
  if (!verdict) return null;
  const { unit } = figureOf(reading);
  return (
    <Box component="section" aria-label="Against the window" sx={{ mt: '18px' }}>
      <SectionHeading end={`${windowText(worked)} ${unit}`}>Against the window</SectionHeading>
      <Box
        sx={{
          display: 'grid',
          gridTemplateColumns: { xs: '1fr', md: 'minmax(0, 1fr) minmax(0, 1fr)' },
          alignItems: 'center',
          gap: '8px 30px',
          pt: '10px',
        }}
      >
        <div>
          <VerdictChip verdict={verdict} />
          {advice && <Box sx={{ mt: '6px' }}>{advice}</Box>}
        </div>
        <WindowBar
          {...scaled(worked)}
          unit={unit}
          tone={verdict === 'pass' ? 'green' : verdict === 'not yet' ? 'oxide' : 'copper'}
          compact={reading.unit === 'Hz'}
        />
      </Box>
    </Box>
  );
}
