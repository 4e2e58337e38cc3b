import { useQuery } from '@tanstack/react-query';
import { useMemo, useState } from 'react';
import { carryOut } from '../../../api-client/carry-out';
import { ProblemError } from '../../../api-client/problem-error';
import { useDraft } from '../../../shared-ui/use-draft';
import { useToast } from '../../../shared-ui/toasts';
import {
  instrumentsQuery,
  useKeepReading,
  type BuildCheck,
  type BuildStage,
  type InstrumentChoice,
} from '../api/builds';
import { benchAddress } from './bench-address';
import { gravesOf } from './cautions';
import { chosenOf, instrumentWait } from './instrument-wait';
import { fieldsOf, liveReading, type Entry, type Live } from './live-reading';
import { prefillOf } from './prefill';
import { readingPlace, type ReadingDraft } from './reading-draft';
import { readingSentence } from './words';

const ENTRY_POINTER = '#/entry/';

/** '#/entry/loadOhms' is the field loadOhms; whatever names no field of the form is left to the alert. */
function fieldErrors(error: unknown): Record<string, string> {
  if (!(error instanceof ProblemError)) return {};
  return Object.fromEntries(
    error.errors.map(({ pointer, detail }) => [
      pointer.startsWith(ENTRY_POINTER) ? pointer.slice(ENTRY_POINTER.length) : pointer.replace('#/', ''),
      detail,
    ]),
  );
}

/** What it may be read on, and what it is. */
function useInstruments(buildId: string, check: BuildCheck, chosenId: string) {
  const choices = useQuery({
    ...instrumentsQuery(buildId, check.id),
    enabled: fieldsOf(check).length > 0,
  });
  const instruments = choices.data ?? [];
  const instrument = chosenOf(instruments, chosenId);
  return {
    instruments,
    instrument,
    /** Why nothing can be kept yet: what it was read on is not known. */
    waitsFor: instrumentWait(check, {
      offered: choices.data,
      hasFailed: choices.isError,
      isChosen: instrument !== undefined,
    }),
    instrumentsProblem: choices.error ?? undefined,
    askForInstruments: () => void choices.refetch(),
  };
}

/** What stands in the fields: what was typed over what the form fills in by itself. */
function useFilledIn(
  check: BuildCheck,
  { checks }: Pick<BuildStage, 'checks'>,
  instrument: InstrumentChoice | undefined,
  typed: Entry,
) {
  const prefill = useMemo(() => prefillOf(check, checks, instrument), [check, checks, instrument]);
  const entry = useMemo(() => ({ ...prefill.entry, ...typed }), [prefill.entry, typed]);
  return { entry, sources: prefill.sources };
}

/** The form of one measured check: what is typed, what it comes to, and keeping it. */
export function useReadingForm(
  buildId: string,
  stage: Pick<BuildStage, 'cautions' | 'checks'>,
  check: BuildCheck,
  onKept: (verdict: string) => void,
) {
  const fields = fieldsOf(check);
  const draft = useDraft<ReadingDraft>(readingPlace(buildId, check.id), {
    entry: {},
    instrumentId: '',
  });
  const say = useToast();
  const keeping = useKeepReading(buildId, check.id);
  const [left, setLeft] = useState<readonly string[]>([]);
  const [ticks, setTicks] = useState<readonly string[]>([]);
  const typed = draft.value.entry;
  const { instrument, waitsFor, ...instruments } = useInstruments(buildId, check, draft.value.instrumentId);
  const { entry, sources } = useFilledIn(check, stage, instrument, typed);
  const live = useMemo(
    () => liveReading(check, entry, instrument?.figures),
    [check, entry, instrument?.figures],
  );
  const [lastGood, setLastGood] = useState<Live>();
  if (live.state === 'read' && live !== lastGood) setLastGood(live);
  const refused = keeping.isError ? fieldErrors(keeping.error) : {};
  const graves = gravesOf(stage.cautions);
  const isTicked = graves.every(({ kind }) => ticks.includes(kind));
  const names = fields.map(({ name }) => name);
  // A refusal that belongs on no field of the form stands in an alert.
  const isOnAField = Object.keys(refused).some((name) => names.includes(name));

  const errorOf = (name: string): string | undefined => {
    if (refused[name]) return refused[name];
    const own = live.state === 'incomplete' ? live.problems[name] : undefined;
    return left.includes(name) ? own : undefined;
  };
  const setEntry = (name: string, text: string) => {
    keeping.reset();
    // Half typed again: its error waits until the field is left again.
    setLeft((before) => before.filter((other) => other !== name));
    draft.setValue({ ...draft.value, entry: { ...typed, [name]: text } });
  };
  const keep = () => {
    if (keeping.isPending) return;
    setLeft(names);
    if (live.state !== 'read' || !isTicked || waitsFor) return;
    const cautionAcknowledged = graves.length > 0 ? isTicked : undefined;
    const body = { method: check.method ?? '', entry, instrumentId: instrument?.id, cautionAcknowledged };
    carryOut(keeping, body, {
      onSuccess: (reading) => {
        draft.drop();
        setLeft([]);
        setTicks([]);
        say(`Reading kept, ${readingSentence(reading)}.`);
        onKept(reading.verdict);
      },
    });
  };

  return {
    ...{ check, fields, entry, setEntry, errorOf, live, lastGood, keep, graves, ticks, isTicked },
    leave: (name: string) => setLeft((before) => [...new Set([...before, name])]),
    setTick: (kind: string, isOn: boolean) =>
      setTicks((before) => (isOn ? [...before, kind] : before.filter((other) => other !== kind))),
    /** Where a value nobody typed came from: 'from FR-021'. */
    sourceOf: (name: string) => (typed[name] === undefined ? sources[name] : undefined),
    /** The same on the level bench. */
    benchPath: benchAddress(check, entry, instrument?.figures),
    ...instruments,
    instrument,
    waitsFor,
    instrumentId: instrument?.id ?? '',
    setInstrument: (instrumentId: string) => draft.setValue({ ...draft.value, instrumentId }),
    problem: isOnAField ? undefined : (keeping.error ?? undefined),
    isKeeping: keeping.isPending,
    keptFrom: draft.keptFrom,
    keptAt: draft.keptAt,
    /** Types the setting that would settle it, and leaves the height to be read anew. */
    takeAgainAt: (voltsPerDivision: string) => {
      const again = { ...typed, voltsPerDivision, divisionsPeakToPeak: '' };
      draft.setValue({ ...draft.value, entry: again });
      setLeft([]);
    },
  };
}

export type ReadingFormState = ReturnType<typeof useReadingForm>;
