import type { Actor } from '@ferrite-row/api/common/actor';
import type { SettableClock } from '@ferrite-row/api/common/clock';
import type { ServiceContext } from '@ferrite-row/api/context';
import type { DemoCalendar } from './calendar';

/** What every part of the seed works with. */
export interface StageSet {
  context: ServiceContext;
  clock: SettableClock;
  calendar: DemoCalendar;
  /** The person with this key, acting. */
  as: (key: string) => Actor;
}

/** Ids of the benches by number and of instruments and kinds by tag and name. */
export interface Inventory {
  bench: (number: number) => string;
  instrument: (tag: string) => string;
  kind: (name: string) => string;
}

/** Looks a key up in what was made; a missing one is a slip in the seed itself. */
export function found<T>(made: ReadonlyMap<string, T>, key: string): T {
  const value = made.get(key);
  if (value === undefined) throw new Error(`The demo club has no ${key}.`);
  return value;
}
