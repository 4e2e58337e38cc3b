import { formatQuantity } from '@ferrite-row/levels';
import Box from '@mui/material/Box';
import Typography from '@mui/material/Typography';
import { VerdictChip } from '../../../shared-ui/states/verdict-chip';
import { WindowBar } from '../../../shared-ui/window-bar';
import type { BuildCheck } from '../api/builds';
import type { Live } from '../logic/live-reading';
import type { ReadingFormState } from '../logic/use-reading-form';
import { readingWords } from '../logic/words';

type Read = Extract<Live, { state: 'read' }>;

/** The last good result: pale while what is typed cannot be read. */
export function shownLive({ live, lastGood }: Pick<ReadingFormState, 'live' | 'lastGood'>) {
  const read = live.state === 'read' ? live : lastGood;
  return read?.state === 'read' ? { read, isStale: live.state !== 'read' } : undefined;
}

/** '0.66 V p-p, 1.09 mW'. */
export function secondValues({ reading }: Read): string {
  const { voltsPeakToPeak, watts, unit } = reading;
  return [
    voltsPeakToPeak === undefined ? undefined : `${formatQuantity(voltsPeakToPeak, 'V', 2, 0.1)} p-p`,
    watts === undefined || unit === 'W' ? undefined : formatQuantity(watts, 'W', 3),
  ]
    .filter((text) => text !== undefined)
    .join(', ');
}

/** '± 0.47 dB at 95 %'. */
export function uncertaintyText({ reading }: Read): string {
  const { plusMinus } = readingWords(reading, 2);
  const unit = reading.unit === 'Hz' ? '' : ` ${reading.uncertaintyUnit}`;
  return `${plusMinus}${unit} at 95 %`;
}

export function BigValue({ read, isStale }: { read: Read; isStale: boolean }) {
  const { value, unit } = readingWords(read.reading, 2);
  return (
    <Typography
      variant="reading"
      component="p"
      sx={{ m: 0, color: isStale ? 'token.ink3' : 'token.ink', whiteSpace: 'nowrap' }}
    >
      {value}
      <Box component="span" sx={{ ml: '5px', fontSize: '1rem', fontWeight: 400, letterSpacing: 0 }}>
        {unit}
      </Box>
    </Typography>
  );
}

export function LiveWindow({ check, read, isStale }: { check: BuildCheck; read: Read; isStale: boolean }) {
  const { windowLow, windowHigh, target, unit } = check;
  return (
    <WindowBar
      low={windowLow ?? undefined}
      high={windowHigh ?? undefined}
      target={target ?? undefined}
      unit={unit ?? ''}
      compact={unit === 'Hz'}
      reading={read.reading}
      tone={isStale ? 'ink3' : read.verdict === 'pass' ? 'green' : 'copper'}
    />
  );
}

/** What the form comes to, while typing: value, uncertainty, window, verdict and what would settle it. */
export function LiveResult({ form }: { form: ReadingFormState }) {
  const shown = shownLive(form);
  if (!shown)
    return (
      <Typography variant="small" component="p" sx={{ my: '10px', color: 'token.ink3' }}>
        The level shows here as you type.
      </Typography>
    );
  const { read, isStale } = shown;
  const colour = isStale ? 'token.ink3' : 'token.ink2';
  return (
    <Box>
      <Box sx={{ display: 'grid', gridTemplateColumns: 'auto minmax(0, 1fr)', gap: '0 24px' }}>
        <Box>
          <BigValue read={read} isStale={isStale} />
          <Typography variant="small" component="p" sx={{ m: 0, color: colour }}>
            {uncertaintyText(read)}
          </Typography>
          <Typography variant="small" component="p" sx={{ m: 0, color: colour }}>
            {secondValues(read)}
          </Typography>
        </Box>
        <Box sx={{ alignSelf: 'center', maxWidth: 270 }}>
          <LiveWindow check={form.check} {...shown} />
        </Box>
      </Box>
      <Box sx={{ display: 'flex', gap: '12px', mt: '6px', alignItems: 'flex-start' }}>
        <VerdictChip verdict={read.verdict} isStale={isStale} />
        {read.advice && (
          <Typography variant="small" component="p" sx={{ m: 0, color: isStale ? colour : 'token.ink' }}>
            {read.advice}
          </Typography>
        )}
      </Box>
    </Box>
  );
}
