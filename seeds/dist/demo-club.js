"use strict";
Object.defineProperty(exports, "__esModule", { value: true });
exports.seedDemoClub = seedDemoClub;
const passwords_1 = require("@ferrite-row/api/auth/passwords");
const club_service_1 = require("@ferrite-row/api/club/club.service");
const people_service_1 = require("@ferrite-row/api/people/people.service");
const bookings_1 = require("./bookings");
const builds_1 = require("./builds/builds");
const calendar_1 = require("./calendar");
const club_1 = require("./club");
const groups_1 = require("./groups");
const inventory_1 = require("./inventory");
const year_1 = require("./money/year");
const nights_1 = require("./nights");
const people_1 = require("./people");
const stage_set_1 = require("./stage-set");
const PASSWORD = 'larkmoor-demo';
/**
 * Lays the demo club around the clock's present, through the services, so that it obeys every rule of the product.
 * The same on every run but for the dates. Leaves the clock where it found it.
 */
async function seedDemoClub(context, clock) {
    const calendar = (0, calendar_1.calendarAround)(clock.now(), club_1.CLUB.timeZone);
    clock.set(calendar.at(calendar.today.subtract({ days: 400 }), 10));
    await context.get(club_service_1.ClubService).set({ ...club_1.CLUB, contactEmail: '' });
    const people = await seedPeople(context);
    const set = { context, clock, calendar, as: (key) => (0, stage_set_1.found)(people, key) };
    const inventory = await (0, inventory_1.seedInventory)(set);
    const groups = await (0, groups_1.seedGroups)(set);
    const plan = await (0, builds_1.publishPlan)(set);
    const stageId = (position) => plan.stages[position - 1]?.stage.id ?? '';
    const nights = await (0, nights_1.seedNights)(set, inventory, stageId);
    const { builds, readings } = await (0, builds_1.seedBuilds)(set, inventory, plan);
    const money = await (0, year_1.seedMoney)(set);
    const bookings = await (0, bookings_1.seedBookings)(set, inventory);
    clock.set(calendar.now);
    await context.get(club_service_1.ClubService).set(club_1.CLUB);
    await sendOldMail(set);
    return { people: people.size, groups, nights, builds, readings, bookings, ...money };
}
/** What the past queued was sent in the past; today's mail begins with today's acts. */
async function sendOldMail({ context }) {
    await context.database.query('UPDATE mail SET sent_at = queued_at, tries = 1 WHERE sent_at IS NULL');
}
async function seedPeople(context) {
    const passwordHash = await context.get(passwords_1.Passwords).hash(PASSWORD);
    const enrolled = await context
        .get(people_service_1.PeopleService)
        .enrol(people_1.PEOPLE.map(({ name, email, roles }) => ({ name, email, roles, passwordHash })));
    const actors = enrolled.map(({ id: personId, name, roles }) => ({ personId, name, roles }));
    return new Map(people_1.PEOPLE.map(({ key }, index) => [key, actors[index]]));
}
//# sourceMappingURL=demo-club.js.map