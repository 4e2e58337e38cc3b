import { Passwords } from '@ferrite-row/api/auth/passwords';
import { ClubService } from '@ferrite-row/api/club/club.service';
import { OpeningHoursService } from '@ferrite-row/api/club/opening-hours.service';
import type { Actor } from '@ferrite-row/api/common/actor';
import type { SettableClock } from '@ferrite-row/api/common/clock';
import type { ServiceContext } from '@ferrite-row/api/context';
import { PeopleService } from '@ferrite-row/api/people/people.service';
import { seedBookings } from './bookings';
import { publishPlan, seedBuilds } from './builds/builds';
import { calendarAround } from './calendar';
import { CLUB, OPENING_HOURS } from './club';
import { seedGroups } from './groups';
import { seedInventory } from './inventory';
import { seedMoney } from './money/year';
import { seedNights } from './nights';
import { PEOPLE } from './people';
import { found, type StageSet } from './stage-set';
import { beginSeeding, endSeeding } from './state';

const PASSWORD = 'larkmoor-demo';

/** How many of what were written, for the line that says so. */
export type Counts = Record<string, number>;

/**
 * Lays the demo club around the clock's present, through the services, so that it obeys every rule of the product.
 * The same on every run but for the dates. Leaves the clock where it found it.
 */
export async function seedDemoClub(context: ServiceContext, clock: SettableClock): Promise<Counts> {
  await beginSeeding(context.database);
  const calendar = calendarAround(clock.now(), CLUB.timeZone);
  clock.set(calendar.at(calendar.today.subtract({ days: 400 }), 10));
  await context.get(ClubService).set(CLUB);
  const people = await seedPeople(context);
  const set: StageSet = { context, clock, calendar, as: (key) => found(people, key) };
  await context.get(OpeningHoursService).set(set.as('greta'), { days: [...OPENING_HOURS] });
  const inventory = await seedInventory(set);
  const groups = await seedGroups(set);
  const plan = await publishPlan(set);
  const stageId = (position: number): string => plan.stages[position - 1]?.stage.id ?? '';
  const nights = await seedNights(set, inventory, stageId);
  const { builds, readings } = await seedBuilds(set, inventory, plan);
  const money = await seedMoney(set);
  const bookings = await seedBookings(set, inventory);
  clock.set(calendar.now);
  await sendOldMail(set);
  await endSeeding(context.database);
  return { people: people.size, groups, nights, builds, readings, bookings, ...money };
}

/** What the past queued was sent in the past; today's mail begins with today's acts. */
async function sendOldMail({ context }: StageSet): Promise<void> {
  await context.database.query('UPDATE mail SET sent_at = queued_at, tries = 1 WHERE sent_at IS NULL');
}

async function seedPeople(context: ServiceContext): Promise<Map<string, Actor>> {
  const passwordHash = await context.get(Passwords).hash(PASSWORD);
  const enrolled = await context
    .get(PeopleService)
    .enrol(PEOPLE.map(({ name, email, roles }) => ({ name, email, roles, passwordHash })));
  const actors = enrolled.map(({ id: personId, name, roles }) => ({ personId, name, roles }));
  return new Map(PEOPLE.map(({ key }, index) => [key, actors[index] as Actor]));
}
