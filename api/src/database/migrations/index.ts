export { PeopleClubMail1700000000001 } from './0001-people-club-mail';
export { PlansInstrumentsGroups1700000000002 } from './0002-plans-instruments-groups';
export { Builds1700000000003 } from './0003-builds';
export { BookingsClearances1700000000004 } from './0004-bookings-clearances';
export { BuildNights1700000000005 } from './0005-build-nights';
export { MoneyDuesReconciliation1700000000006 } from './0006-money-dues-reconciliation';
export { SignInAddresses1700000000007 } from './0007-sign-in-addresses';
export { WhatHangsTogether1700000000008 } from './0008-what-hangs-together';
