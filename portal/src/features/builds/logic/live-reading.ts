import {
  assumptionsWith,
  entryFields,
  ENTRY_METHODS,
  gainReading,
  LevelsError,
  meterUnitOf,
  readEntry,
  readingFromInputs,
  scopeInput,
  tighterScale,
  tooCloseText,
  verdictOf,
  type EntryField,
  type EntryMethod,
  type InstrumentFigures,
  type LevelReading,
  type TighterScale,
  type Verdict,
  type VerdictWindow,
} from '@ferrite-row/levels';
import type { BuildCheck } from '../api/builds';

export type Entry = Record<string, string>;
type Asked = Pick<BuildCheck, 'method' | 'unit' | 'windowLow' | 'windowHigh' | 'defaults'>;

export const entryMethod = ({ method }: Pick<BuildCheck, 'method'>): EntryMethod | undefined =>
  ENTRY_METHODS.find((known) => known === method);

export function fieldsOf(check: Pick<BuildCheck, 'method' | 'unit'>): readonly EntryField[] {
  const method = entryMethod(check);
  return method ? entryFields(method, meterUnitOf(check.unit ?? '')) : [];
}

const windowOf = ({ windowLow, windowHigh }: Asked): VerdictWindow => ({
  low: windowLow ?? undefined,
  high: windowHigh ?? undefined,
});

/** What a half or wholly typed form comes to, worked out while typing. The server works it out again and decides. */
export type Live =
  | { state: 'incomplete'; problems: Record<string, string> }
  | {
      state: 'read';
      reading: LevelReading;
      verdict: Verdict;
      /** Why it is too close to call and what would settle it; empty otherwise. */
      advice: string;
      tighter?: TighterScale;
    };

/**
 * @param figures - of the instrument chosen, as far as it states any.
 */
export function liveReading(check: Asked, entry: Entry, figures: InstrumentFigures = {}): Live {
  const method = entryMethod(check);
  if (!method) return { state: 'incomplete', problems: {} };
  const unit = meterUnitOf(check.unit ?? '');
  const { inputs, problems } = readEntry(method, entry, unit);
  if (problems.length > 0) return { state: 'incomplete', problems: byField(problems) };
  const assumptions = assumptionsWith(method, check.unit ?? '', check.defaults, figures);
  try {
    const reading = readingFromInputs(method, inputs, assumptions, unit);
    const window = windowOf(check);
    const verdict = verdictOf(reading.value, reading.expandedUncertainty, window);
    if (verdict !== 'too close to call') return { state: 'read', reading, verdict, advice: '' };
    const isScope = method === 'oscilloscope';
    const tighter = isScope ? tighterScale(scopeInput(inputs, assumptions), window) : undefined;
    return { state: 'read', reading, verdict, advice: tooCloseText(reading, window, tighter), tighter };
  } catch (error) {
    if (!(error instanceof LevelsError)) throw error;
    return { state: 'incomplete', problems: byField([error]) };
  }
}

const byField = (problems: readonly LevelsError[]): Record<string, string> =>
  Object.fromEntries(problems.map(({ input, message }) => [input, message]));

type Level = Pick<LevelReading, 'value' | 'unit' | 'uncertaintyUnit' | 'expandedUncertainty'>;

/** What a gain would come to with the level being typed; undefined while a part of it is missing. */
export function liveGain(
  gain: Asked & Pick<BuildCheck, 'fromCheckIds'>,
  levelOf: (checkId: string) => Level | undefined,
): Level | undefined {
  const [output, input] = gain.fromCheckIds.map(levelOf);
  if (gain.method !== 'gain' || !output || !input) return undefined;
  return gainReading({ output, input });
}
