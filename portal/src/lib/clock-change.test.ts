import { clockChange } from './club-time';

// The days on which the clocks change are those of the IANA time zone database (2026d).
describe('a change of the clocks', () => {
  it.each([
    ['2026-03-29', 'Europe/London', 'forward'],
    ['2026-10-25', 'Europe/London', 'back'],
    ['2026-10-26', 'Europe/London', undefined],
    ['2027-03-14', 'America/New_York', 'forward'],
    ['2027-04-04', 'Australia/Sydney', 'back'],
  ])('on %s in %s goes %s', (day, zone, way) => {
    expect(clockChange(day, zone)).toBe(way);
  });
});
