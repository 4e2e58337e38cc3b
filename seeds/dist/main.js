"use strict";
var __importDefault = (this && this.__importDefault) || function (mod) {
    return (mod && mod.__esModule) ? mod : { "default": mod };
};
Object.defineProperty(exports, "__esModule", { value: true });
const clock_1 = require("@ferrite-row/api/common/clock");
const context_1 = require("@ferrite-row/api/context");
const data_source_1 = __importDefault(require("@ferrite-row/api/database/data-source"));
const demo_club_1 = require("./demo-club");
const state_1 = require("./state");
/** Fills an empty database with the demo club. A database with anybody else in it is left as it is. */
async function main() {
    if (process.env.NODE_ENV === 'production')
        throw new Error('The demo club is not seeded in production.');
    if (await isInhabited())
        return console.log('The club has people already: nothing is seeded.');
    // Laying out a past must not set off today's jobs, such as sending its mail.
    process.env.FERRITE_JOBS = 'off';
    const clock = new clock_1.SettableClock(new Date());
    const context = await (0, context_1.openContext)(clock);
    try {
        const began = performance.now();
        const counts = await (0, demo_club_1.seedDemoClub)(context, clock);
        const seconds = ((performance.now() - began) / 1000).toFixed(1);
        const written = Object.entries(counts).map(([what, n]) => `${n} ${what}`);
        console.log(`Seeded the demo club in ${seconds} s: ${written.join(', ')}.`);
    }
    finally {
        await context.close();
    }
}
/** Asked with a bare connection: wiring the whole API to hear 'yes' would cost every start two seconds. */
async function isInhabited() {
    await data_source_1.default.initialize();
    try {
        const state = await (0, state_1.stateOfClub)(data_source_1.default);
        if (state === 'half seeded')
            await (0, state_1.wipe)(data_source_1.default);
        return state === 'inhabited';
    }
    finally {
        await data_source_1.default.destroy();
    }
}
void main().catch((error) => {
    console.error(error);
    process.exitCode = 1;
});
//# sourceMappingURL=main.js.map