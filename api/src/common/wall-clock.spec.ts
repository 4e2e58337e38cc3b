import { addDays, clubDay, dateWords, endOfDay } from './club-day';
import { hoursWords, spanWords } from './wall-clock';

const LONDON = 'Europe/London';
const at = (iso: string): Date => new Date(iso);

// Changes of the clock in the United Kingdom: forward on 29 March 2026 at 01:00 UTC, back on 25 October 2026 at 01:00 UTC.
describe('the club’s wall clock', () => {
  it('shows the club’s day, not UTC’s', () => {
    expect(clubDay(at('2026-07-01T23:30:00Z'), LONDON)).toBe('2026-07-02');
    expect(clubDay(at('2026-01-01T23:30:00Z'), LONDON)).toBe('2026-01-01');
    expect(clubDay(at('2026-01-01T11:30:00Z'), 'Pacific/Auckland')).toBe('2026-01-02');
  });

  it('ends a day at the wall’s midnight: 23 hours long in spring, 25 in autumn', () => {
    expect(endOfDay('2026-03-28', LONDON)).toEqual(at('2026-03-29T00:00:00Z'));
    expect(endOfDay('2026-03-29', LONDON)).toEqual(at('2026-03-29T23:00:00Z'));
    expect(endOfDay('2026-10-24', LONDON)).toEqual(at('2026-10-24T23:00:00Z'));
    expect(endOfDay('2026-10-25', LONDON)).toEqual(at('2026-10-26T00:00:00Z'));
  });

  it('counts days over the end of a month and a leap day', () => {
    expect(addDays('2028-02-28', 2)).toBe('2028-03-01');
  });

  it('says days and spans as the club reads them', () => {
    expect(dateWords('2026-12-09')).toBe('9 Dec 2026');
    const afternoon = { startsAt: at('2026-10-17T13:00:00Z'), endsAt: at('2026-10-17T15:30:00Z') };
    expect(spanWords(afternoon, LONDON)).toBe('Sat 17 Oct, 14:00 to 16:30');
    const late = { startsAt: at('2026-10-17T21:00:00Z'), endsAt: at('2026-10-17T23:30:00Z') };
    expect(spanWords(late, LONDON)).toBe('Sat 17 Oct, 22:00 to Sun 18 Oct, 00:30');
    expect(hoursWords(afternoon, LONDON)).toBe('14:00 to 16:30');
    expect(hoursWords(late, LONDON)).toBe('22:00 to Sun 18 Oct, 00:30');
  });
});
