import { fixed, signed } from '../../lib/text';
import { VERDICTS } from '../states/state-words';
import type { LevelRow } from './level-rows';

const within = (value: number): string => `plus or minus ${Number(fixed(value))}`;

function gainWords({ gainMeasuredDb, gainPlannedDb }: LevelRow): string {
  if (gainPlannedDb === undefined) return '';
  if (gainMeasuredDb === undefined) return ` Gain planned ${signed(gainPlannedDb)}.`;
  return ` Gain ${signed(gainMeasuredDb)}, planned ${signed(gainPlannedDb)}.`;
}

/** "Mixer. Planned −16.5, plus or minus 2. Measured −16.4, plus or minus 0.4. Gain −6.9, planned −6.5. Headroom 10.5 dB. Pass." */
export function spokenRow(row: LevelRow): string {
  const { point, measured, headroomDb, isHeadroomLow, verdict } = row;
  const plan = `${point.name}. Planned ${signed(point.planDbm)}, ${within(point.toleranceDb)}.`;
  const reading = measured
    ? ` ${row.isBeingEntered ? 'Being entered' : 'Measured'} ${signed(measured.levelDbm)}, ${within(measured.expandedUncertaintyDb)}.`
    : ' Not measured.';
  const headroom =
    headroomDb === undefined
      ? ' No limit.'
      : ` Headroom ${fixed(headroomDb)} dB${isHeadroomLow ? ', low' : ''}.`;
  return plan + reading + gainWords(row) + headroom + (verdict ? ` ${VERDICTS[verdict].words}.` : '');
}

/** One sentence for the drawing as a whole. */
export function summary(rows: readonly LevelRow[]): string {
  const [first, last] = [rows[0], rows[rows.length - 1]];
  if (!first || !last) return 'Level diagram without stages.';
  const measured = rows.filter((row) => row.measured).length;
  return (
    `Planned level from ${signed(first.point.planDbm)} dBm at ${first.point.name} to ` +
    `${signed(last.point.planDbm)} dBm at ${last.point.name}, ${measured} of ${rows.length} measured.`
  );
}

/** Power of a level that is a whole number of tens, as an axis writes it: 40 gives '10 W', −20 gives '10 µW'. */
export function powerLabel(dbm: number): string {
  const exponent = dbm / 10 - 3;
  const group = Math.floor(exponent / 3);
  const unit = ['pW', 'nW', 'µW', 'mW', 'W', 'kW', 'MW'][group + 4];
  return unit ? `${10 ** (exponent - group * 3)} ${unit}` : '';
}

/** A stage's name on two lines at most, broken at a space near the middle, or after a hyphen. */
export function twoLines(name: string): [string, string?] {
  const spaces = [...name.matchAll(/ /g)].map((match) => match.index);
  const middle = name.length / 2;
  const [at] = spaces.sort((a, b) => Math.abs(a - middle) - Math.abs(b - middle));
  if (at !== undefined) return [name.slice(0, at), name.slice(at + 1)];
  const hyphen = name.indexOf('-');
  return name.length > 9 && hyphen > 0 ? [name.slice(0, hyphen + 1), name.slice(hyphen + 1)] : [name];
}
