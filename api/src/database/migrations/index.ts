export { PeopleClubMail1700000000001 } from './0001-people-club-mail';
export { PlansInstrumentsGroups1700000000002 } from './0002-plans-instruments-groups';
export { BookingsClearances1700000000004 } from './0004-bookings-clearances';
export { MoneyDuesReconciliation1700000000006 } from './0006-money-dues-reconciliation';
