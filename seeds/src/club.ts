import type { ClubSettings } from '@ferrite-row/api/club/club.service';
import type { OpenDay } from '@ferrite-row/api/club/opening-hours.rules';

export const CLUB: ClubSettings = {
  name: 'Larkmoor Radio Builders',
  address: 'Millbeck Hall, Larkmoor',
  contactEmail: 'desk@larkmoor.example',
  timeZone: 'Europe/London',
  currency: 'GBP',
  ruleSet: 'IARU-R1',
  accountName: 'Larkmoor Radio Builders',
  accountNumber: '00-41-17 3006 4417',
};

const openOn = (weekday: number, opens: number, closes: number): OpenDay => ({
  weekday,
  opensMinute: opens * 60,
  closesMinute: closes * 60,
});

/** Weekdays from noon, Saturdays from ten; on Sundays the hall is shut. */
export const OPENING_HOURS: readonly OpenDay[] = [
  ...[1, 2, 3, 4, 5].map((weekday) => openOn(weekday, 12, 22)),
  openOn(6, 10, 20),
];
