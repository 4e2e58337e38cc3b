"use strict";
Object.defineProperty(exports, "__esModule", { value: true });
exports.tierOf = exports.TIERS = void 0;
exports.billsUntil = billsUntil;
const dice_1 = require("../dice");
const people_1 = require("../people");
exports.TIERS = [
    { name: 'full', amountMinor: 2400, months: 3 },
    { name: 'concession', amountMinor: 1200, months: 3 },
    { name: 'junior', amountMinor: 600, months: 3 },
    { name: 'household', amountMinor: 4000, months: 3 },
];
const NOT_FULL = new Map([
    ['ines', 'concession'],
    ['bea', 'concession'],
    ['desmond', 'concession'],
    ['rhoda', 'concession'],
    ['yusra', 'junior'],
    ['ruben', 'junior'],
    ['gwil', 'household'],
]);
const tierOf = (who) => NOT_FULL.get(who) ?? 'full';
exports.tierOf = tierOf;
const WAYS = ['transfer', 'card', 'transfer', 'cash', 'transfer', 'card', 'cheque'];
/** Tamsin pays by card, so that her next invoice waits for the card page. */
const wayOf = (who) => who === 'tamsin' ? 'card' : (WAYS[people_1.PEOPLE.findIndex(({ key }) => key === who) % WAYS.length] ?? 'cash');
const MONTH = new Intl.DateTimeFormat('en-GB', { month: 'long', timeZone: 'UTC' });
const monthName = (day) => MONTH.format(new Date(`${day.toString()}T12:00:00Z`));
/** Four runs of dues, a quarter of a year each; the last was raised on the first of this month. */
function duesBills(today) {
    const firstOfMonth = today.with({ day: 1 });
    return [9, 6, 3, 0].flatMap((monthsAgo) => {
        const raisedOn = firstOfMonth.subtract({ months: monthsAgo });
        const dueOn = raisedOn.with({ day: raisedOn.daysInMonth });
        const description = `Dues, ${monthName(raisedOn)} to ${monthName(raisedOn.add({ months: 2 }))}`;
        return people_1.PEOPLE.map(({ key }) => {
            const amountMinor = exports.TIERS.find(({ name }) => name === (0, exports.tierOf)(key))?.amountMinor ?? 2400;
            const isOpen = monthsAgo === 0 && (key === 'tamsin' || key === 'lena');
            const paidOn = isOpen
                ? null
                : raisedOn.add({ days: Math.floor((0, dice_1.diceOf)(`${key} ${monthsAgo}`).between(1, 27)) });
            return {
                who: key,
                kind: 'dues',
                description,
                amountMinor,
                raisedOn,
                dueOn,
                way: wayOf(key),
                paidOn,
            };
        });
    });
}
const IN_THE_COURSE = [
    'tamsin',
    'lena',
    'marek',
    'noor',
    'mairi',
    'jonty',
    'bea',
    'tobias',
    'kofi',
    'priya',
    'rhoda',
    'ansel',
    'idris',
    'yusra',
];
/** The course's fee when it began, and its kit in four parts. */
function courseBills(today) {
    return IN_THE_COURSE.flatMap((who) => {
        const dice = (0, dice_1.diceOf)(`course ${who}`);
        const part = (kind, description, amountMinor, dueInDays) => {
            const dueOn = today.add({ days: dueInDays });
            const raisedOn = dueOn.subtract({ days: 30 });
            const paidOn = dueInDays > 20 ? null : dueOn.subtract({ days: Math.floor(dice.between(2, 20)) });
            return { who, kind, description, amountMinor, raisedOn, dueOn, way: wayOf(who), paidOn };
        };
        return [
            part('course fee', 'Course fee, Larkmoor Twenty', 6000, -75),
            part('kit', 'Kit, 1 of 4', 3600, -70),
            part('kit', 'Kit, 2 of 4', 3600, -40),
            part('kit', 'Kit, 3 of 4', 3600, 25),
        ];
    });
}
/** Who has not paid, and since when: days since it was due. */
const LATE = [
    { who: 'lena', description: 'Toroids and wire', amountMinor: 1850, daysLate: 24 },
    { who: 'kofi', description: 'Crystal set for the filter', amountMinor: 2240, daysLate: 38 },
    { who: 'wilf', description: 'Locker for the year', amountMinor: 2400, daysLate: 11 },
    { who: 'desmond', description: 'Meter repair', amountMinor: 1275, daysLate: 66 },
    { who: 'cosmo', description: 'Enclosure, drilled', amountMinor: 3100, daysLate: 104 },
];
function lateBills(today) {
    return LATE.map(({ who, description, amountMinor, daysLate }) => {
        const dueOn = today.subtract({ days: daysLate });
        return {
            who,
            kind: 'kit',
            description,
            amountMinor,
            raisedOn: dueOn.subtract({ days: 30 }),
            dueOn,
            way: 'transfer',
            paidOn: null,
        };
    });
}
/** Every invoice of the past year that has been raised by today, oldest first. */
function billsUntil(today) {
    const order = (a, b) => (a.raisedOn.toString() < b.raisedOn.toString() ? -1 : 1);
    const all = [...duesBills(today), ...courseBills(today), ...lateBills(today)];
    return all.filter(({ raisedOn }) => raisedOn.toString() <= today.toString()).sort(order);
}
//# sourceMappingURL=bills.js.map