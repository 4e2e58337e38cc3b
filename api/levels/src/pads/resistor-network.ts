import type { PadPoint, PadResistor } from './pad-values';

/** A current into a point of the network, A. */
export type PadCurrents = Partial<Record<Exclude<PadPoint, 'ground'>, number>>;

const POINTS = ['in', 'mid', 'out'] as const;

/**
 * Voltages at a pad's points by nodal analysis: conductances in a matrix, solved by elimination.
 *
 * One way for every kind of pad, and another one than the formulas that design them.
 *
 * @param resistors - with what terminates the pad among them, so that no point hangs free.
 * @returns volts against ground; 0 at a point the pad does not have.
 */
export function pointVoltages(
  resistors: readonly Pick<PadResistor, 'from' | 'to' | 'ohms'>[],
  currents: PadCurrents,
): Record<PadPoint, number> {
  const used = POINTS.filter((point) => resistors.some(({ from, to }) => from === point || to === point));
  const rows = used.map((point) => [
    ...used.map((other) => conductance(resistors, point, other)),
    currents[point] ?? 0,
  ]);
  const volts = solved(rows);
  const at = (point: PadPoint) => volts[used.findIndex((known) => known === point)] ?? 0;
  return { in: at('in'), mid: at('mid'), out: at('out'), ground: 0 };
}

function conductance(
  resistors: readonly Pick<PadResistor, 'from' | 'to' | 'ohms'>[],
  point: PadPoint,
  other: PadPoint,
): number {
  let sum = 0;
  for (const { from, to, ohms } of resistors) {
    const touches = from === point || to === point;
    const joins = (from === point && to === other) || (from === other && to === point);
    if (point === other && touches) sum += 1 / ohms;
    if (point !== other && joins) sum -= 1 / ohms;
  }
  return sum;
}

/** Gauss and Jordan without pivoting: the matrix of a grounded resistor network dominates by its diagonal. */
function solved(rows: number[][]): number[] {
  rows.forEach((row, column) => {
    const pivot = row[column] ?? 1;
    for (let k = 0; k < row.length; k++) row[k] = (row[k] ?? 0) / pivot;
    for (const other of rows) {
      if (other === row) continue;
      const factor = other[column] ?? 0;
      for (let k = 0; k < row.length; k++) other[k] = (other[k] ?? 0) - factor * (row[k] ?? 0);
    }
  });
  return rows.map((row) => row.at(-1) ?? 0);
}
