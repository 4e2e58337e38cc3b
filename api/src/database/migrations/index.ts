export { PeopleClubMail1700000000001 } from './0001-people-club-mail';
export { PlansInstrumentsGroups1700000000002 } from './0002-plans-instruments-groups';
export { Builds1700000000003 } from './0003-builds';
export { BookingsClearances1700000000004 } from './0004-bookings-clearances';
export { BuildNights1700000000005 } from './0005-build-nights';
export { MoneyDuesReconciliation1700000000006 } from './0006-money-dues-reconciliation';
export { MoneyHoldsByItself1700000000009 } from './0009-money-holds-by-itself';
