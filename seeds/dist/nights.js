"use strict";
Object.defineProperty(exports, "__esModule", { value: true });
exports.seedNights = seedNights;
const places_service_1 = require("@ferrite-row/api/build-nights/places.service");
const planning_service_1 = require("@ferrite-row/api/build-nights/planning.service");
const night_changes_service_1 = require("@ferrite-row/api/build-nights/night-changes.service");
const COURSE_NIGHTS = 22;
const NIGHTS_BEHIND = 11;
const PLACES = 8;
const COMING = ['tamsin', 'lena', 'mairi', 'jonty', 'marek', 'noor', 'bea', 'tobias', 'kofi', 'priya'];
/** Thursdays on which the hall is open, eleven behind the next one and ten after it. */
function courseDays({ calendar }) {
    const days = [calendar.nextNight];
    const skipped = [];
    const step = (from, weeks) => {
        const day = from.add({ days: 7 * weeks });
        if (!calendar.isHoliday(day))
            return day;
        skipped.push(day);
        return step(day, weeks);
    };
    for (let behind = 0; behind < NIGHTS_BEHIND; behind += 1)
        days.unshift(step(days[0] ?? calendar.nextNight, -1));
    while (days.length < COURSE_NIGHTS)
        days.push(step(days.at(-1) ?? calendar.nextNight, 1));
    return { days, skipped };
}
/** The course's evenings and a few others, and who said they are coming. */
async function seedNights(set, inventory, stageId) {
    const nightIds = await scheduleCourse(set, inventory);
    for (const [index, nightId] of nightIds.entries())
        await sayComing(set, nightId, index);
    await focus(set, nightIds, stageId);
    return nightIds.length + (await seedOneOffs(set, inventory));
}
async function scheduleCourse(set, inventory) {
    const { context, clock, calendar, as } = set;
    const { days, skipped } = courseDays(set);
    const [first] = days;
    if (!first)
        throw new Error('The course has no night.');
    clock.set(calendar.at(first.subtract({ days: 14 }), 12));
    const { nights } = await context.get(planning_service_1.PlanningService).schedule(as('hollis'), {
        title: 'Larkmoor Twenty',
        startsAt: calendar.at(first, 19).toISOString(),
        endsAt: calendar.at(first, 22).toISOString(),
        places: PLACES,
        benchIds: [1, 2, 3, 4, 5, 6].map(inventory.bench),
        mentorIds: [as('hollis').personId, as('greta').personId],
        repeat: { rule: `FREQ=WEEKLY;COUNT=${COURSE_NIGHTS + skipped.length}` },
        skip: skipped.map((day) => day.toString()),
        tellByMail: false,
    });
    return nights.map(({ id }) => id);
}
/** How many say so for the night with this index: behind us nearly full, ahead filling up, two waiting on the next but one. */
function howMany(index) {
    if (index < NIGHTS_BEHIND)
        return index % 3 === 0 ? 7 : PLACES;
    const ahead = [PLACES, PLACES + 2, 5, 4, 3, 2];
    return ahead[index - NIGHTS_BEHIND] ?? 1;
}
async function sayComing({ context, clock, calendar, as }, nightId, index) {
    const said = courseDaysBefore(calendar.nextNight, index);
    for (const [order, key] of COMING.slice(0, howMany(index)).entries()) {
        const at = calendar.at(said.add({ days: Math.floor(order / 2) }), 18, order);
        clock.set(at < calendar.now ? at : calendar.now);
        await context.get(places_service_1.PlacesService).come(as(key), nightId);
    }
}
/** People say so in the week before; for nights still far off, in the last days. */
function courseDaysBefore(nextNight, index) {
    return nextNight.add({ days: 7 * Math.min(0, index - NIGHTS_BEHIND) - 10 });
}
async function focus({ context, clock, calendar, as }, nightIds, stageId) {
    clock.set(calendar.now);
    const ahead = nightIds.slice(NIGHTS_BEHIND, NIGHTS_BEHIND + 6);
    for (const [index, nightId] of ahead.entries()) {
        const stageIds = [8 + Math.floor(index / 2), 9 + Math.floor(index / 2)].map(stageId);
        await context.get(night_changes_service_1.NightChangesService).change(as('hollis'), nightId, { stageIds });
    }
}
const ONE_OFFS = [
    {
        title: 'Soldering class',
        day: -9,
        from: [10, 0],
        to: [12, 30],
        places: 8,
        bench: 5,
        mentor: 'orla',
        coming: ['rhoda', 'ansel', 'yusra', 'tobias', 'ruben', 'edda'],
    },
    {
        title: 'Scope clearance',
        day: -6,
        from: [19, 0],
        to: [21, 0],
        places: 5,
        bench: 2,
        mentor: 'greta',
        coming: ['yusra', 'ansel', 'rhoda', 'idris', 'thea'],
    },
    {
        title: 'Vector clearance',
        day: 8,
        from: [19, 0],
        to: [21, 0],
        places: 4,
        bench: 1,
        mentor: 'orla',
        coming: ['tamsin', 'tobias', 'mairi'],
    },
    {
        title: 'Winding class',
        day: 12,
        from: [10, 0],
        to: [11, 30],
        places: 10,
        bench: 5,
        mentor: 'greta',
        coming: ['ansel', 'rhoda', 'sunniva', 'gwil'],
    },
    {
        title: 'Licence evening',
        day: 16,
        from: [19, 30],
        to: [21, 0],
        places: 20,
        mentor: 'greta',
        coming: ['tamsin', 'tobias', 'kofi', 'yusra', 'ruben', 'thea', 'edda', 'cosmo', 'wilf'],
    },
    {
        title: 'Etching evening',
        day: 15,
        from: [18, 0],
        to: [20, 0],
        places: 6,
        bench: 6,
        mentor: 'orla',
        coming: ['idris', 'jonty'],
        cancelled: 'The extractor is being repaired.',
    },
];
async function seedOneOffs(set, inventory) {
    const monday = set.calendar.today.subtract({ days: set.calendar.today.dayOfWeek - 1 });
    for (const one of ONE_OFFS)
        await scheduleOneOff(set, inventory, one, monday.add({ days: one.day }));
    return ONE_OFFS.length;
}
async function scheduleOneOff({ context, clock, calendar, as }, inventory, one, day) {
    const early = calendar.at(day.subtract({ days: 10 }), 12);
    clock.set(early < calendar.now ? early : calendar.now);
    const { nights } = await context.get(planning_service_1.PlanningService).schedule(as(one.mentor), {
        title: one.title,
        startsAt: calendar.at(day, ...one.from).toISOString(),
        endsAt: calendar.at(day, ...one.to).toISOString(),
        places: one.places,
        benchIds: one.bench === undefined ? [] : [inventory.bench(one.bench)],
        tellByMail: false,
    });
    const nightId = nights[0]?.id ?? '';
    for (const key of one.coming)
        await context.get(places_service_1.PlacesService).come(as(key), nightId);
    if (one.cancelled)
        await context.get(night_changes_service_1.NightChangesService).cancel(as(one.mentor), nightId, { reason: one.cancelled });
}
//# sourceMappingURL=nights.js.map