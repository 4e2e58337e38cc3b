import { hoursProblems, openSpans } from './opening-hours.rules';

const ZONE = 'Europe/London';
const day = (weekday: number, opens: number, closes: number) => ({
  weekday,
  opensMinute: opens * 60,
  closesMinute: closes * 60,
});
const WEEK = [day(4, 12, 22), day(6, 10, 20)];
const within = (from: string, to: string, week = WEEK) =>
  openSpans({ startsAt: new Date(from), endsAt: new Date(to) }, week, ZONE).map(({ startsAt, endsAt }) => [
    startsAt.toISOString(),
    endsAt.toISOString(),
  ]);

describe('the stretches in which the workshop is open', () => {
  it('are the hours of each open day, by the wall, and nothing of a closed one', () => {
    // Thursday 15 to Sunday 18 October 2026, British Summer Time.
    expect(within('2026-10-15T00:00:00Z', '2026-10-18T12:00:00Z')).toEqual([
      ['2026-10-15T11:00:00.000Z', '2026-10-15T21:00:00.000Z'],
      ['2026-10-17T09:00:00.000Z', '2026-10-17T19:00:00.000Z'],
    ]);
  });

  it('begin and end with the span that is asked about', () => {
    expect(within('2026-10-15T14:30:00Z', '2026-10-15T15:00:00Z')).toEqual([
      ['2026-10-15T14:30:00.000Z', '2026-10-15T15:00:00.000Z'],
    ]);
    expect(within('2026-10-16T08:00:00Z', '2026-10-16T20:00:00Z')).toEqual([]);
  });

  it('stay at the wall’s time when the clocks go back', () => {
    // The clocks go back on Sunday 25 October 2026; Thursday 22 is an hour ahead of UTC, Thursday 29 is not.
    expect(within('2026-10-22T00:00:00Z', '2026-10-30T00:00:00Z', [day(4, 19, 24)])).toEqual([
      ['2026-10-22T18:00:00.000Z', '2026-10-22T23:00:00.000Z'],
      ['2026-10-29T19:00:00.000Z', '2026-10-30T00:00:00.000Z'],
    ]);
  });

  it('are all of the time when the club gives no hours', () => {
    const [from, to] = ['2026-10-15T00:00:00.000Z', '2026-10-18T12:00:00.000Z'];
    expect(within(from, to, [])).toEqual([[from, to]]);
  });
});

describe('given hours', () => {
  it('are refused when a day closes on its opening or before it, at that day', () => {
    expect(hoursProblems(WEEK)).toEqual([]);
    expect(hoursProblems([day(1, 12, 22), day(2, 20, 20), day(3, 20, 8)])).toEqual([
      { pointer: '#/days/1/closesMinute', detail: 'It closes when it opens, or before.' },
      { pointer: '#/days/2/closesMinute', detail: 'It closes when it opens, or before.' },
    ]);
  });
});
