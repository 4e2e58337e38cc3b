import { figureWords } from '@ferrite-row/levels';
import Box from '@mui/material/Box';
import { useQuery } from '@tanstack/react-query';
import { formatDate } from '../../../lib/club-time-text';
import { fixed, damageWords } from '../../../lib/text';
import { CautionBox } from '../../../shared-ui/caution-box';
import { LoadingBars } from '../../../shared-ui/loading-bars';
import { ProblemAlert } from '../../../shared-ui/problem-alert';
import { SectionHeading } from '../../../shared-ui/section-heading';
import { historyQuery, instrumentQuery, type Instrument } from '../api/instruments';
import { calibrationWords, changeWords, clearanceWords } from '../instrument-words';

/** What an opened instrument says of itself: what harms it, three facts, why not, and what was done to it. */
export function InstrumentFacts({ instrument }: { instrument: Instrument }) {
  const detail = useQuery(instrumentQuery(instrument.id));
  const { damageLevelDbm, amplitudeAccuracyDb, conditionNote, kind, reasons, figures } = instrument;
  const sheet = figureWords(figures)
    .filter(({ name }) => name !== 'amplitudeAccuracyDb')
    .map(({ label, words }): Fact => [label, words]);
  const facts: readonly Fact[] = [
    ['Calibration', calibrationWords(instrument)],
    ...(amplitudeAccuracyDb === null && sheet.length > 0 ? [] : [goodTo(amplitudeAccuracyDb)]),
    kind.needsClearance
      ? ['Cleared on it', detail.data ? `${detail.data.clearedPeople} people` : '']
      : ['Clearance', clearanceWords(instrument)],
  ];
  return (
    <>
      {conditionNote && <p>{conditionNote}</p>}
      {damageLevelDbm !== null && (
        <CautionBox kind="RF power" name={`Never above ${damageWords(damageLevelDbm)} at the input.`}>
          A pad first wherever the level may be higher, rated for the whole power.
        </CautionBox>
      )}
      <Facts facts={[...facts, ...sheet]} />
      {reasons.map(({ code, reason, remedy }) => (
        <Box key={code} component="p" sx={{ typography: 'small', color: 'token.brass' }}>
          {reason} {remedy}
        </Box>
      ))}
      <History instrumentId={instrument.id} />
    </>
  );
}

const goodTo = (decibels: number | null): Fact => [
  'Good to',
  decibels === null ? 'not stated' : `± ${fixed(decibels)} dB`,
];

type Fact = readonly [name: string, value: string];

function Facts({ facts }: { facts: readonly Fact[] }) {
  return (
    <Box component="dl" sx={FACTS}>
      {facts.map(([name, value]) => (
        <div key={name}>
          <Box component="dt" sx={{ typography: 'small', color: 'token.ink2' }}>
            {name}
          </Box>
          <Box component="dd" sx={{ m: 0, fontWeight: 700 }}>
            {value}
          </Box>
        </div>
      ))}
    </Box>
  );
}

function History({ instrumentId }: { instrumentId: string }) {
  const history = useQuery(historyQuery(instrumentId));
  if (history.isPending) return <LoadingBars rows={3} label="Loading the history" />;
  if (!history.data) return <ProblemAlert error={history.error} onRetry={() => void history.refetch()} />;
  const { items, total } = history.data;
  return (
    <section aria-label="History">
      <SectionHeading end={items.length < total ? `the latest ${items.length} of ${total}` : undefined}>
        History
      </SectionHeading>
      {items.length === 0 && (
        <Box sx={{ ...LINE, color: 'token.ink2' }}>Nothing was changed since it came.</Box>
      )}
      {items.map((change) => (
        <Box key={change.id} sx={LINE}>
          <Box component="span" sx={{ color: 'token.ink2' }}>
            {formatDate(change.changedAt)}, {change.changedBy}
          </Box>
          <div>
            <b>{changeWords(change)}.</b> {change.note}
          </div>
        </Box>
      ))}
    </section>
  );
}

const LINE = {
  typography: 'small',
  py: '7px',
  borderBottom: '1px solid',
  borderColor: 'token.rule',
} as const;
const FACTS = {
  display: 'grid',
  gridTemplateColumns: 'repeat(3, 1fr)',
  gap: '12px',
  m: '14px 0',
  py: '8px',
  borderBlock: '1px solid',
  borderColor: 'token.rule',
} as const;
