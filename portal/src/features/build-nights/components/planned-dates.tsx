import Box from '@mui/material/Box';
import Link from '@mui/material/Link';
import { useQuery } from '@tanstack/react-query';
import type { UseFormReturn } from 'react-hook-form';
import { dayText, formatSpan } from '../../../lib/club-time-text';
import { listText } from '../../../lib/text';
import { LoadingBars } from '../../../shared-ui/loading-bars';
import { ProblemAlert } from '../../../shared-ui/problem-alert';
import { SectionHeading } from '../../../shared-ui/section-heading';
import { StateLine } from '../../../shared-ui/states/state-line';
import { benchChoicesQuery, mentorChoicesQuery, type Choice } from '../api/choices';
import type { CheckedNight } from '../api/nights';
import { benchWords, plannedWords } from '../night-words';
import type { PlanForm } from '../plan-form';
import type { PlanPreview } from './use-plan-preview';

interface PlannedDatesProps {
  form: UseFormReturn<PlanForm>;
  preview: PlanPreview;
}

/** Each date of the plan with its verdict, its reason, and a remedy that is one press. */
export function PlannedDates({ form, preview }: PlannedDatesProps) {
  const { nights, failure, isReadable, isStale } = preview;
  const kept = nights.filter(({ verdict }) => verdict !== 'left out').map(({ date }) => date);
  return (
    <Box component="section" aria-label="Dates" sx={{ mt: '12px' }}>
      <SectionHeading end={!isReadable ? 'no dates yet' : isStale ? 'looking' : 'checked as you type'}>
        <Box component="span" sx={{ fontSize: '0.84375rem' }}>
          {plannedWords(kept)}
        </Box>
      </SectionHeading>
      {failure !== undefined && (
        <Box sx={{ mt: '8px' }}>
          <ProblemAlert error={failure} title="The dates could not be looked up." onRetry={preview.retry} />
        </Box>
      )}
      {nights.length === 0 && isReadable && isStale && failure === undefined && (
        <LoadingBars rows={4} label="Looking up dates" />
      )}
      <Box component="ul" aria-live="polite" sx={{ m: 0, p: 0, listStyle: 'none' }}>
        {nights.map((night) => (
          <PlannedDate key={night.date} night={night} form={form} />
        ))}
      </Box>
    </Box>
  );
}

const LOOKS = {
  clear: { shape: 'tick', colour: 'green', words: 'Clear' },
  clash: { shape: 'octagon', colour: 'oxide', words: 'Clash' },
  'left out': { shape: 'ring', colour: 'ink3', words: 'Left out' },
} as const;

function PlannedDate({ night, form }: { night: CheckedNight; form: UseFormReturn<PlanForm> }) {
  const { shape, colour, words } = LOOKS[night.verdict];
  return (
    <Box
      component="li"
      sx={{ py: '4px', borderBottom: '1px solid', borderColor: 'token.rule', fontSize: '0.8125rem' }}
    >
      <Box sx={{ display: 'grid', gridTemplateColumns: '92px 1fr auto', lineHeight: '1.25rem' }}>
        <b>{dayText(night.date)}</b>
        <Box component="span" sx={{ color: 'token.ink2' }}>
          {formatSpan(night.startsAt, night.endsAt)}
        </Box>
        <StateLine shape={shape} colour={colour}>
          {words}
        </StateLine>
      </Box>
      <Box sx={{ typography: 'small', color: 'token.ink2' }}>
        {night.clashes.map(({ detail }) => detail).join(' ')} <Remedies night={night} form={form} />
      </Box>
    </Box>
  );
}

function Remedies({ night, form }: { night: CheckedNight; form: UseFormReturn<PlanForm> }) {
  const benches = useQuery(benchChoicesQuery).data ?? [];
  const mentors = useQuery(mentorChoicesQuery).data ?? [];
  const { date, verdict, remedy } = night;
  const { skip, instead, repeats, mentorIds } = form.getValues();
  const write = (change: Partial<Pick<PlanForm, 'skip' | 'instead'>>) => {
    if (change.skip) form.setValue('skip', change.skip, { shouldDirty: true });
    if (change.instead) form.setValue('instead', change.instead, { shouldDirty: true });
  };
  const own = instead.find((other) => other.date === date);
  const others = instead.filter((other) => other.date !== date);
  const take = (change: typeof remedy) => write({ instead: [...others, { ...own, ...change, date }] });
  if (verdict === 'left out') {
    return <Press onClick={() => write({ skip: skip.filter((day) => day !== date) })}>Put it back</Press>;
  }
  if (verdict === 'clear') {
    if (!own) return null;
    return (
      <>
        {insteadWords(own, benches, mentors)}{' '}
        <Press onClick={() => write({ instead: others })}>Take back</Press>
      </>
    );
  }
  const added = remedy.mentorIds?.filter((id) => !mentorIds.includes(id));
  const presses = [
    remedy.benchIds && (
      <Press key="benches" onClick={() => take({ benchIds: remedy.benchIds })}>
        Use {benchWords(labels(benches, remedy.benchIds))}
      </Press>
    ),
    remedy.mentorIds && (
      <Press key="mentors" onClick={() => take({ mentorIds: remedy.mentorIds })}>
        {added?.length
          ? `Ask ${firstNames(mentors, added)}`
          : `Leave it to ${firstNames(mentors, remedy.mentorIds)}`}
      </Press>
    ),
    repeats !== 'once' && (
      <Press key="skip" onClick={() => write({ skip: [...skip, date] })}>
        {remedy.benchIds || remedy.mentorIds ? 'skip this night' : 'Skip this night'}
      </Press>
    ),
  ].filter(Boolean);
  return presses.map((press, index) => (
    <span key={index}>
      {index > 0 && ' or '}
      {press}
    </span>
  ));
}

const labels = (choices: readonly Choice[], ids: readonly string[]): string[] =>
  choices.filter(({ value }) => ids.includes(value)).map(({ label }) => label);

const firstNames = (mentors: readonly Choice[], ids: readonly string[]): string =>
  listText(labels(mentors, ids).map((name) => name.split(' ')[0]));

function insteadWords(
  own: PlanForm['instead'][number],
  benches: readonly Choice[],
  mentors: readonly Choice[],
): string {
  const parts = [
    own.benchIds && benchWords(labels(benches, own.benchIds)),
    own.mentorIds && firstNames(mentors, own.mentorIds),
  ].filter(Boolean);
  return `With ${parts.join(' and ')}.`;
}

function Press({ onClick, children }: { onClick: () => void; children: React.ReactNode }) {
  return (
    <Link
      component="button"
      type="button"
      onClick={onClick}
      sx={{ font: 'inherit', fontWeight: 700, minHeight: 24, verticalAlign: 'baseline' }}
    >
      {children}
    </Link>
  );
}
