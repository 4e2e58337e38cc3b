import type { ClubSettings } from '@ferrite-row/api/club/club.service';

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
