export { PeopleClubMail1700000000001 } from './0001-people-club-mail';
export { PlansInstrumentsGroups1700000000002 } from './0002-plans-instruments-groups';
export { Builds1700000000003 } from './0003-builds';
export { BookingsClearances1700000000004 } from './0004-bookings-clearances';
