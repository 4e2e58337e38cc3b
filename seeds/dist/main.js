"use strict";
Object.defineProperty(exports, "__esModule", { value: true });
const context_1 = require("@ferrite-row/api/context");
const clock_1 = require("@ferrite-row/api/common/clock");
const demo_club_1 = require("./demo-club");
const state_1 = require("./state");
/** Fills an empty database with the demo club. A database with anybody else in it is left as it is. */
async function main() {
    if (process.env.NODE_ENV === 'production')
        throw new Error('The demo club is not seeded in production.');
    // Laying out a past must not set off today's jobs, such as sending its mail.
    process.env.FERRITE_JOBS = 'off';
    const clock = new clock_1.SettableClock(new Date());
    const context = await (0, context_1.openContext)(clock);
    try {
        const state = await (0, state_1.stateOfClub)(context);
        if (state === 'inhabited')
            return console.log('The club has people already: nothing is seeded.');
        if (state === 'half seeded')
            await (0, state_1.wipe)(context);
        const began = performance.now();
        const counts = await (0, demo_club_1.seedDemoClub)(context, clock);
        const seconds = ((performance.now() - began) / 1000).toFixed(1);
        console.log(`Seeded the demo club in ${seconds} s: ${Object.entries(counts)
            .map(([what, n]) => `${n} ${what}`)
            .join(', ')}.`);
    }
    finally {
        await context.close();
    }
}
void main().catch((error) => {
    console.error(error);
    process.exitCode = 1;
});
//# sourceMappingURL=main.js.map