import { Temporal } from 'temporal-polyfill';
import { instantOf, wallOf } from '../common/wall-clock';
import { occurrencesOf } from './occurrences.rules';
import calendar from './reference/calendar.json';

const compactWall = (text: string) => Temporal.PlainDateTime.from(text);
const minutes = (instant: Date) => `${instant.toISOString().slice(0, 16)}Z`;

/** Each case names its own source beside it in reference/calendar.json. */
describe('a rule of RFC 5545', () => {
  it.each([...calendar.rfc5545, ...calendar.club_cases])(
    'falls on the published days and instants: $id',
    ({ inputs, expected }) => {
      const zone = inputs.TZID;
      const isLeftOut = (wall: Temporal.PlainDateTime) =>
        (inputs.EXDATE as string[]).some((day) => compactWall(day).equals(wall));
      const start = compactWall(inputs.DTSTART);
      const found = occurrencesOf({ start, rule: inputs.RRULE, zone }, isLeftOut, inputs.first_n ?? 1000);
      expect(found.map((wall) => wall.toString().slice(0, 16))).toEqual(expected.local);
      expect(found.map((wall) => minutes(instantOf(wall, zone)))).toEqual(expected.utc);
    },
  );
});

describe('the wall and the instant', () => {
  it.each(calendar.zone_changes)('knows when the clocks change: $id', ({ inputs, expected }) => {
    for (const { utc, wall_before, wall_after } of expected.changes) {
      const change = new Date(utc);
      expect(wallOf(change, inputs.zone).toString().slice(0, 16)).toBe(wall_after);
      const lastBefore = wallOf(new Date(change.getTime() - 60_000), inputs.zone);
      expect(lastBefore.add({ minutes: 1 }).toString().slice(0, 16)).toBe(wall_before);
    }
  });

  // A wall time alone cannot ask for the second occurrence (fold 1); the first is what RFC 5545, 3.3.5 prescribes.
  it.each(calendar.gap_and_overlap.filter(({ inputs }) => inputs.fold === 0))(
    'reads a wall time that is skipped or comes twice: $id',
    ({ inputs, expected }) => {
      const instant = instantOf(compactWall(inputs.wall), inputs.zone);
      expect(minutes(instant)).toBe(expected.utc);
      expect(wallOf(instant, inputs.zone).toString().slice(0, 16)).toBe(expected.round_trip_wall);
    },
  );

  it.each(calendar.gap_and_overlap.filter(({ inputs }) => inputs.fold === 1))(
    'shows the second occurrence of a wall time: $id',
    ({ inputs, expected }) => {
      expect(wallOf(new Date(expected.utc), inputs.zone).toString().slice(0, 16)).toBe(
        expected.round_trip_wall,
      );
    },
  );

  it.each(calendar.durations.filter(({ inputs }) => 'from_wall' in inputs))(
    'gives a night across a change its true length: $id',
    ({ inputs, expected }) => {
      const { zone = '', from_wall = '', to_wall = '' } = inputs;
      const length =
        instantOf(compactWall(to_wall), zone).getTime() - instantOf(compactWall(from_wall), zone).getTime();
      expect(length / 3_600_000).toBe(expected.elapsed_h);
    },
  );
});
