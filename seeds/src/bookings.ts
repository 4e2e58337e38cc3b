import { MemberBookingsService } from '@ferrite-row/api/bookings/member-bookings.service';
import type { DemoCalendar } from './calendar';
import type { Inventory, StageSet } from './stage-set';

interface DemoBooking {
  who: string;
  /** Days from the Monday of this week. */
  day: number;
  from: [hour: number, minute: number];
  hours: number;
  bench?: number;
  instruments?: string[];
  /** Not next week: the calibration or the clearance has run out by then. */
  isThisWeekOnly?: boolean;
}

const booking = (
  who: string,
  day: number,
  from: [number, number],
  hours: number,
  bench?: number,
  ...instruments: string[]
): DemoBooking => ({ who, day, from, hours, ...(bench === undefined ? {} : { bench }), instruments });

/** One week of the benches, kept clear of Thursday evenings, which go by the night's own plan. */
const A_WEEK: readonly DemoBooking[] = [
  booking('mairi', 0, [18, 0], 2, 3),
  booking('priya', 0, [18, 30], 1, undefined, 'FR-031'),
  booking('ansel', 0, [14, 0], 3, 6, 'FR-051'),
  booking('tobias', 1, [14, 0], 2, 3, 'FR-023'),
  booking('rhoda', 1, [19, 0], 2, 5, 'FR-022'),
  booking('lena', 2, [19, 0], 2, 3),
  booking('marek', 2, [18, 0], 1.5, 4, 'FR-031', 'FR-052'),
  booking('idris', 2, [14, 0], 2, 2, 'FR-034'),
  booking('tamsin', 3, [14, 0], 1.5, 3, 'FR-021'),
  booking('bea', 3, [15, 30], 2, 2, 'FR-021'),
  booking('noor', 4, [17, 0], 2, 3, 'FR-014'),
  { ...booking('sunniva', 4, [13, 0], 2, 1, 'FR-040'), isThisWeekOnly: true },
  { ...booking('kofi', 5, [16, 30], 1, undefined, 'FR-031'), isThisWeekOnly: true },
  booking('priya', 5, [12, 0], 1, 3),
  booking('jonty', 5, [18, 0], 2, 3, 'FR-032'),
  booking('yusra', 5, [13, 0], 2.5, 6, 'FR-051', 'FR-022'),
];

/** This week and next, each booked a few days ahead as members do. */
export async function seedBookings(set: StageSet, inventory: Inventory): Promise<number> {
  const { calendar } = set;
  const monday = calendar.today.subtract({ days: calendar.today.dayOfWeek - 1 });
  const nextWeek = A_WEEK.filter(({ isThisWeekOnly }) => !isThisWeekOnly).map((one) => ({
    ...one,
    day: one.day + 7,
  }));
  const all = [...A_WEEK, ...nextWeek];
  for (const one of all) await book(set, inventory, one, monday.add({ days: one.day }));
  return all.length;
}

async function book(
  { context, clock, calendar, as }: StageSet,
  inventory: Inventory,
  { who, from, hours, bench, instruments = [] }: DemoBooking,
  day: DemoCalendar['today'],
): Promise<void> {
  const startsAt = calendar.at(day, ...from);
  const madeAt = new Date(startsAt.getTime() - 3 * 24 * 3_600_000);
  clock.set(madeAt < calendar.now ? madeAt : calendar.now);
  const endsAt = new Date(startsAt.getTime() + hours * 3_600_000);
  const resourceIds = [
    ...(bench === undefined ? [] : [inventory.bench(bench)]),
    ...instruments.map(inventory.instrument),
  ];
  const wanted = { resourceIds, startsAt: startsAt.toISOString(), endsAt: endsAt.toISOString() };
  await context.get(MemberBookingsService).book(as(who), wanted);
}
