import { ENOUGH_REL, formatQuantity, type FittedElement, type FittedLadder } from '@ferrite-row/levels';
import { capital, counted, fixed } from '../../../lib/text';

export interface PartRow {
  /** "C1, C5". */
  names: string;
  exact: string;
  /** "220 + 150 pF", "13 turns, 710 nH". */
  nearest: string;
  /** How far the nearest is from the exact one: 0.007. */
  errorRel: number;
}

const SIGNIFICANT = 3;

/** A part's value in its own unit. */
export const valueOf = ({ part }: Pick<FittedElement, 'part'>, value: number): string =>
  formatQuantity(value, part === 'inductor' ? 'H' : 'F', SIGNIFICANT);

/** Two in parallel as a sum, the unit once where both share it. */
function sumOf(parts: readonly string[]): string {
  const [first = '', second] = parts;
  if (second === undefined) return first;
  const [number = '', unit] = first.split(' ');
  return second.endsWith(` ${unit ?? ''}`) ? `${number} + ${second}` : `${first} + ${second}`;
}

function nearestOf(element: FittedElement): string {
  const { turns, fitted } = element;
  if (turns)
    return `${turns.turns} ${turns.turns === 1 ? 'turn' : 'turns'}, ${valueOf(element, element.value)}`;
  return sumOf((fitted?.parts ?? [element.value]).map((value) => valueOf(element, value)));
}

/** What to fit, like parts in one row, in the order they are met from the source. */
export function partRows({ elements }: FittedLadder): PartRow[] {
  const rows = new Map<string, PartRow>();
  for (const element of elements) {
    const exact = valueOf(element, element.exactValue);
    const nearest = nearestOf(element);
    const key = `${element.part} ${exact} ${nearest}`;
    const row = rows.get(key);
    if (row) row.names += `, ${element.name}`;
    else rows.set(key, { names: element.name, exact, nearest, errorRel: element.errorRel });
  }
  return [...rows.values()];
}

/** "Five capacitors and two coils": what will be on the bench, two in parallel counted as two. */
export function partCount({ elements }: FittedLadder): string {
  const coils = elements.filter(({ part }) => part === 'inductor').length;
  const capacitors = elements.reduce((sum, { fitted }) => sum + (fitted?.parts.length ?? 0), 0);
  return `${capital(counted(capacitors, 'capacitor'))} and ${counted(coils, 'coil')}`;
}

/** Parts that come out further off than they scatter, in words; whole turns on a large core are seldom near. */
export function farOffWords(ladder: FittedLadder, toleranceRel: number): string | undefined {
  const off = partRows(ladder)
    .filter(({ errorRel }) => Math.abs(errorRel) > Math.max(toleranceRel, ENOUGH_REL))
    .map(
      ({ names, errorRel }) =>
        `${names} ${fixed(Math.abs(errorRel) * 100)} % ${errorRel < 0 ? 'low' : 'high'}`,
    );
  if (off.length === 0) return undefined;
  return `Further off than the parts scatter: ${off.join('; ')}. Another core or a finer series comes nearer.`;
}
