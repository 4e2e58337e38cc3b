import type { Bench, Instrument } from '../api/bench-book';

/** One bench or instrument in a column of its own. */
export type Lane = { id: string; tag: string; name: string } & (
  { kind: 'bench'; instrument?: undefined } | { kind: 'instrument'; instrument: Instrument }
);

/** More would be too narrow to read: the list shows everything. */
export const MOST_LANES = 3;

export const benchLane = ({ id, tag, name }: Bench): Lane => ({ id, tag, name, kind: 'bench' });

export const instrumentLane = (instrument: Instrument): Lane => {
  const { id, tag, name } = instrument;
  return { id, tag, name, kind: 'instrument', instrument };
};

/**
 * The lanes that are shown: those named by tag, in that order; unknown tags are passed over. With none named, the
 * first bench and the first instrument the person may use.
 */
export function lanesShown(all: readonly Lane[], tags: readonly string[]): Lane[] {
  const named = tags.flatMap((tag) => all.find((lane) => lane.tag === tag) ?? []);
  if (named.length > 0) return named.slice(0, MOST_LANES);
  const bench = all.find(({ kind }) => kind === 'bench');
  const instrument = all.find((lane) => lane.kind === 'instrument' && lane.instrument.mayBook);
  return [bench, instrument].filter((lane) => lane !== undefined);
}
