import Box from '@mui/material/Box';
import Typography from '@mui/material/Typography';
import { dateText, formatInClubZone } from '../../../lib/club-time-text';
import { capital, counted } from '../../../lib/text';
import { AssetTag } from '../../../shared-ui/asset-tag';
import { SectionHeading } from '../../../shared-ui/section-heading';
import { StateLine, VerdictLine } from '../../../shared-ui/states/state-line';
import { VERDICTS } from '../../../shared-ui/states/state-words';
import { WindowBar } from '../../../shared-ui/window-bar';
import type { BuildCheck, BuildStage } from '../api/builds';
import { readingInForce } from '../logic/stage';
import { readingWords, windowText } from '../logic/words';
import { PhotoList } from './photo-list';

/** Columns a phone has no room for; their news is in the others. */
const WIDE = { display: { xs: 'none', md: 'table-cell' } };
const WIDE_HEADERS = ['Against window', 'With'];

const CELL = {
  py: '7px',
  px: '6px',
  borderBottom: '1px solid',
  borderColor: 'token.rule',
  fontSize: '0.8125rem',
  lineHeight: '1.25rem',
  verticalAlign: 'middle',
  '&:first-of-type': { pl: 0 },
};

/** Everything a mentor decides on: readings against their windows, ticks, photos, instruments. */
export function Evidence({ stage }: { stage: BuildStage }) {
  const photos = stage.checks.flatMap((check) => check.photos);
  return (
    <Box sx={{ display: 'grid', gridTemplateColumns: 'minmax(0, 1fr)', gap: '24px' }}>
      <Readings checks={stage.checks.filter(({ kind }) => kind === 'measure')} />
      <Ticks checks={stage.checks.filter(({ kind }) => kind === 'tick' || kind === 'safety')} />
      {photos.length > 0 && (
        <section>
          <SectionHeading end={capital(counted(photos.length, 'photo'))}>Photos</SectionHeading>
          <PhotoList photos={photos} isLarge />
        </section>
      )}
      <Instruments checks={stage.checks} />
    </Box>
  );
}

function Readings({ checks }: { checks: readonly BuildCheck[] }) {
  if (checks.length === 0) return null;
  const kept = checks.filter(({ readings }) => readings.length > 0).length;
  const close = checks.filter((check) => readingInForce(check)?.verdict !== 'pass').length;
  const end = `${capital(counted(kept, 'kept', 'kept'))}, ${close === 0 ? 'all pass' : `${close} not settled`}`;
  return (
    <section>
      <SectionHeading end={end}>Readings</SectionHeading>
      <Box sx={{ overflowX: 'auto' }}>
        <Box component="table" sx={{ width: '100%', borderCollapse: 'collapse', fontSize: '0.8125rem' }}>
          <thead>
            <tr>
              {['Reading', 'Measured', 'Window', 'Against window', 'With', 'Result'].map((header) => (
                <Box
                  component="th"
                  key={header}
                  scope="col"
                  sx={{
                    ...CELL,
                    textAlign: 'left',
                    fontWeight: 600,
                    typography: 'least',
                    color: 'token.ink3',
                    borderColor: 'token.ink',
                    ...(WIDE_HEADERS.includes(header) && WIDE),
                  }}
                >
                  {header}
                </Box>
              ))}
            </tr>
          </thead>
          <tbody>
            {checks.map((check) => (
              <ReadingRow key={check.id} check={check} />
            ))}
          </tbody>
        </Box>
      </Box>
    </section>
  );
}

function ReadingRow({ check }: { check: BuildCheck }) {
  const reading = readingInForce(check);
  const words = reading && readingWords(reading, 1);
  const isClose = reading?.verdict === 'too close to call';
  return (
    <Box component="tr" sx={{ backgroundColor: isClose ? 'token.brassTint' : 'transparent' }}>
      <Box
        component="th"
        scope="row"
        sx={{ ...CELL, textAlign: 'left', fontWeight: 700, '&:first-of-type': { pl: isClose ? '8px' : 0 } }}
      >
        {check.title}
        {check.readings.length > 1 && (
          <Typography variant="small" component="span" sx={{ ml: '6px', color: 'token.ink3' }}>
            {check.readings.length} tries
          </Typography>
        )}
      </Box>
      <Box component="td" sx={{ ...CELL, textAlign: 'right', whiteSpace: 'nowrap' }}>
        {words && (
          <>
            <b>{words.value}</b> {words.plusMinus} {words.unit}
          </>
        )}
      </Box>
      <Box component="td" sx={{ ...CELL, whiteSpace: 'nowrap' }}>
        {windowText(check, false)}
      </Box>
      <Box component="td" sx={{ ...CELL, ...WIDE, width: 118 }}>
        <WindowBar
          low={check.windowLow ?? undefined}
          high={check.windowHigh ?? undefined}
          reading={reading}
          tone="ink"
          compact
        />
      </Box>
      <Box component="td" sx={{ ...CELL, ...WIDE }}>
        {reading?.instrumentTag ? (
          <AssetTag>{reading.instrumentTag}</AssetTag>
        ) : (
          <Typography variant="small" component="span" sx={{ color: 'token.ink2', whiteSpace: 'nowrap' }}>
            {check.method === 'gain' ? 'worked out' : check.method === 'carried' ? 'carried over' : ''}
          </Typography>
        )}
      </Box>
      <Box component="td" sx={CELL}>
        {reading && <VerdictLine verdict={reading.verdict}>{VERDICTS[reading.verdict].short}</VerdictLine>}
      </Box>
    </Box>
  );
}

function Ticks({ checks }: { checks: readonly BuildCheck[] }) {
  if (checks.length === 0) return null;
  return (
    <section>
      <SectionHeading>Ticked by the builder</SectionHeading>
      <Box component="ul" sx={{ m: 0, p: 0, listStyle: 'none' }}>
        {checks.map(({ id, title, mark }) => (
          <Box
            component="li"
            key={id}
            sx={{
              ...CELL,
              px: 0,
              display: 'flex',
              justifyContent: 'space-between',
              gap: '12px',
              flexWrap: 'wrap',
            }}
          >
            <span>{title}</span>
            {mark ? (
              <StateLine shape="tick" colour="green">
                {formatInClubZone(mark.at)}
              </StateLine>
            ) : (
              <StateLine shape="ring" colour="ink3">
                Not ticked
              </StateLine>
            )}
          </Box>
        ))}
      </Box>
    </section>
  );
}

function Instruments({ checks }: { checks: readonly BuildCheck[] }) {
  const used = new Map(
    checks
      .flatMap(({ readings }) => readings)
      .filter(({ instrumentTag }) => instrumentTag !== null)
      .map(({ instrumentTag, calibrationDueOn }) => [instrumentTag ?? '', calibrationDueOn]),
  );
  if (used.size === 0) return null;
  return (
    <section>
      <SectionHeading end="All in calibration on the day">Instruments used</SectionHeading>
      <Box sx={{ display: 'flex', flexWrap: 'wrap', gap: '8px 28px', pt: '10px' }}>
        {[...used].map(([tag, due]) => (
          <Typography key={tag} variant="small" component="span">
            <AssetTag>{tag}</AssetTag> {due && `due ${dateText(due)}`}
          </Typography>
        ))}
      </Box>
    </section>
  );
}
