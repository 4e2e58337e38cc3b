import { wantedNights } from './plan.rules';

/**
 * In London the clocks go back on 31 October 2027 and forward on 26 March 2028, both at 01:00 UTC: the last Sundays of
 * those months, by the Summer Time Order 2002 (SI 2002/262) and Directive 2000/84/EC, article 2.
 */
const ZONE = 'Europe/London';
const NOW = new Date('2027-06-01T12:00:00Z');

const spans = (startsAt: string, endsAt: string, rule?: string): string[] =>
  wantedNights({ startsAt, endsAt, ...(rule && { repeat: { rule } }) }, ZONE, NOW, ['a mentor']).map(
    (night) => `${short(night.startsAt)} ${short(night.endsAt)}`,
  );
const short = (instant: Date): string => `${instant.toISOString().slice(0, 16)}Z`;

describe('a night across the change of the clocks', () => {
  it.each([
    ['across the change back', '2027-10-31T00:45Z', '2027-10-31T01:15Z'],
    ['in the hour that comes again', '2027-10-31T01:30Z', '2027-10-31T03:30Z'],
    ['that ends in the hour that comes again', '2027-10-30T21:00Z', '2027-10-31T01:30Z'],
    ['across the change forward', '2028-03-25T21:00Z', '2028-03-26T01:30Z'],
  ])('keeps the given instants: %s', (_, startsAt, endsAt) => {
    expect(spans(startsAt, endsAt)).toEqual([`${startsAt} ${endsAt}`]);
  });

  it('keeps 19:30 to 22:00 on the wall through a series, at both changes', () => {
    expect(spans('2027-10-27T18:30Z', '2027-10-27T21:00Z', 'FREQ=WEEKLY;COUNT=2')).toEqual([
      '2027-10-27T18:30Z 2027-10-27T21:00Z',
      '2027-11-03T19:30Z 2027-11-03T22:00Z',
    ]);
    expect(spans('2028-03-22T19:30Z', '2028-03-22T22:00Z', 'FREQ=WEEKLY;COUNT=2')).toEqual([
      '2028-03-22T19:30Z 2028-03-22T22:00Z',
      '2028-03-29T18:30Z 2028-03-29T21:00Z',
    ]);
  });

  it('ends at the same hour on the wall on the very night of a change: an hour longer or shorter', () => {
    // 22:00 to 02:30 on Saturdays: 4.5 hours, 5.5 in the night of the change back, 3.5 in that of the change forward.
    expect(spans('2027-10-23T21:00Z', '2027-10-24T01:30Z', 'FREQ=WEEKLY;COUNT=3')).toEqual([
      '2027-10-23T21:00Z 2027-10-24T01:30Z',
      '2027-10-30T21:00Z 2027-10-31T02:30Z',
      '2027-11-06T22:00Z 2027-11-07T02:30Z',
    ]);
    expect(spans('2028-03-18T22:00Z', '2028-03-19T02:30Z', 'FREQ=WEEKLY;COUNT=2')[1]).toBe(
      '2028-03-25T22:00Z 2028-03-26T01:30Z',
    );
  });

  it('begins an hour later and lasts as long when the wall skips the start', () => {
    expect(spans('2028-03-19T01:30Z', '2028-03-19T02:15Z', 'FREQ=WEEKLY;COUNT=3')).toEqual([
      '2028-03-19T01:30Z 2028-03-19T02:15Z',
      '2028-03-26T01:30Z 2028-03-26T02:15Z',
      '2028-04-02T00:30Z 2028-04-02T01:15Z',
    ]);
  });

  it('lasts as long as the first when that one’s own hours ran backwards on the wall', () => {
    expect(spans('2027-10-31T00:45Z', '2027-10-31T01:15Z', 'FREQ=WEEKLY;COUNT=2')).toEqual([
      '2027-10-31T00:45Z 2027-10-31T01:15Z',
      '2027-11-07T01:45Z 2027-11-07T02:15Z',
    ]);
  });

  it('takes the hours of the wall from a first night that the change made longer', () => {
    expect(spans('2027-10-30T21:00Z', '2027-10-31T02:30Z', 'FREQ=WEEKLY;COUNT=2')[1]).toBe(
      '2027-11-06T22:00Z 2027-11-07T02:30Z',
    );
  });

  it('ends after it begins wherever in the two nights of a change a series falls', () => {
    for (const sunday of ['2027-10-24', '2028-03-19']) {
      for (let minute = 0; minute < 240; minute += 15) {
        const start = new Date(Date.parse(`${sunday}T00:00:00Z`) + minute * 60_000);
        const end = new Date(start.getTime() + 30 * 60_000);
        const nights = wantedNights(
          {
            startsAt: start.toISOString(),
            endsAt: end.toISOString(),
            repeat: { rule: 'FREQ=WEEKLY;COUNT=2' },
          },
          ZONE,
          NOW,
          ['a mentor'],
        );
        for (const { startsAt, endsAt } of nights) expect(endsAt > startsAt).toBe(true);
      }
    }
  });
});
