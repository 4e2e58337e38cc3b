import { assumptionsWith, baseUnitsIn, type InstrumentFigures } from '@ferrite-row/levels';
import type { BuildCheck } from '../api/builds';
import { entryMethod, fieldsOf, type Entry } from './live-reading';

type Level = { value: number; expandedUncertainty: number };

const address = (way: string, inputs: Readonly<Record<string, string | number>>): string => {
  const query = Object.entries(inputs).map(([name, text]) => [name, String(text)]);
  return `/level-bench/readings?${new URLSearchParams([['way', way], ...query]).toString()}`;
};

/** A fraction is typed there in per cent; everything else as it stands. */
const typedFigure = (name: string, value: number): number =>
  name.endsWith('Rel') ? Number((100 * value).toPrecision(12)) : value;

/** Windows are typed in the unit of the reading, a frequency's in megahertz. */
function windowInputs({ windowLow, windowHigh, target, unit }: BuildCheck): Record<string, string | number> {
  const scale = unit === 'Hz' ? baseUnitsIn('MHz') : 1;
  const ends = { low: windowLow, high: windowHigh, target };
  return Object.fromEntries(
    Object.entries(ends).map(([end, value]) => [end, value === null ? '' : value / scale]),
  );
}

/**
 * The same reading on the level bench: what was typed, its window, and what is taken for granted of plan and instrument.
 *
 * @returns undefined for a check that is not read off an instrument.
 */
export function benchAddress(
  check: BuildCheck,
  entry: Entry,
  figures: InstrumentFigures = {},
): string | undefined {
  const method = entryMethod(check);
  if (!method) return undefined;
  const unit = check.unit ?? '';
  const fields = fieldsOf(check).map(({ name }) => name);
  const assumed = assumptionsWith(method, unit, check.defaults, figures);
  const isPeak = assumed.againstPeakEnvelopePower === 1;
  // A meter's fields are told apart by its unit there, what it takes for granted is not.
  const keyOf = (name: string) =>
    `${method}.${name}${method === 'meter' && name !== 'accuracyRel' ? `-${unit}` : ''}`;
  const inputs = {
    ...Object.fromEntries(Object.entries(assumed).map(([name, value]) => [name, typedFigure(name, value)])),
    ...Object.fromEntries(fields.map((name) => [name, entry[name] ?? ''])),
    ...windowInputs(check),
    ...(isPeak && { against: 'peak envelope power' }),
  };
  const named = Object.entries(inputs).map(([name, text]) => [keyOf(name), text] as const);
  return address(method, {
    ...(method === 'meter' && { 'meter.unit': unit }),
    ...Object.fromEntries(named),
  });
}

/** A gain on the level bench, of the two levels it is worked out from. */
export function gainAddress(
  check: BuildCheck,
  [output, input]: readonly (Level | undefined)[],
): string | undefined {
  if (check.method !== 'gain' || !output || !input) return undefined;
  const inputs = {
    ...{ output: output.value, outputUncertainty: output.expandedUncertainty },
    ...{ input: input.value, inputUncertainty: input.expandedUncertainty },
    ...windowInputs(check),
  };
  return address(
    'gain',
    Object.fromEntries(Object.entries(inputs).map(([name, value]) => [`gain.${name}`, value])),
  );
}
