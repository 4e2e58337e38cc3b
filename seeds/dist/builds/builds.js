"use strict";
Object.defineProperty(exports, "__esModule", { value: true });
exports.publishPlan = publishPlan;
exports.seedBuilds = seedBuilds;
const plans_service_1 = require("@ferrite-row/api/plans/plans.service");
const larkmoor_twenty_1 = require("../plan/larkmoor-twenty");
const one_build_1 = require("./one-build");
const progress_1 = require("./progress");
/** Publishes the club's plan, a good while before the course begins. */
async function publishPlan({ context, clock, calendar, as }) {
    clock.set(calendar.at(calendar.today.subtract({ days: 150 }), 21));
    const plans = context.get(plans_service_1.PlansService);
    const content = await plans.content(await plans.publish(as('hollis'), larkmoor_twenty_1.LARKMOOR_TWENTY));
    const stages = content.stages.map((stage) => ({
        stage,
        checks: content.checks.get(stage.id) ?? [],
    }));
    return { planId: content.planId, stages };
}
/** Everybody's build, as far as it has come by now. */
async function seedBuilds(set, inventory, plan) {
    let readings = 0;
    for (const [index, progress] of progress_1.PROGRESS.entries()) {
        const build = new one_build_1.OneBuild(set, inventory, progress, index % 2 === 0 ? 'hollis' : 'greta');
        await playOut(set, build, plan, progress);
        readings += build.readings;
    }
    return { builds: progress_1.PROGRESS.length, readings };
}
const WORDS = [
    'Came out first time.',
    'One cold joint found and mended.',
    'Took the second try; see both readings.',
    '',
];
const ANSWERS = [
    'Tidy work.',
    'Good. Keep the screen on.',
    'Looked at the joints, all sound.',
    'Nice windings.',
];
async function playOut(set, build, { planId, stages }, progress) {
    const { signedOff, withMentor = 0, onTheBench } = progress;
    const begun = signedOff + withMentor;
    const when = evenings(set, begun + (onTheBench === undefined ? 0 : 1), progress.nightsOnIt ?? 0);
    await build.start(planId, when(-1));
    for (const [index, one] of stages.slice(0, begun).entries()) {
        if (one.stage.cautions.includes('licence needed'))
            await build.showLicence();
        await build.work(one, when(index));
        await build.submit(one.stage, WORDS[index % WORDS.length] ?? '');
        const reviewedAt = new Date(when(index).getTime() + 110 * 60_000);
        if (index < signedOff)
            await build.signOff(one, reviewedAt, ANSWERS[index % ANSWERS.length] ?? '');
        else if (progress.sentBack)
            await comeBack(build, one, reviewedAt, progress);
    }
    const current = stages[begun];
    if (onTheBench === undefined || !current)
        return;
    await build.work(current, when(begun), onTheBench);
    if (progress.who === 'tamsin')
        await tooClose(build, current);
}
async function comeBack(build, { stage }, at, { sentBack = '', isSentAgain }) {
    await build.sendBack(stage, at, sentBack);
    if (isSentAgain)
        await build.submit(stage, 'Soldered again, steady now.');
}
/** The reading the stage page opens on: 3.3 divisions at 20 mV, which straddles the lower limit. */
async function tooClose(build, { stage, checks }) {
    const output = checks.find(({ method, windowLow }) => method === 'oscilloscope' && windowLow === 0);
    if (!output)
        throw new Error('The pre-driver has no output level to read.');
    const entry = {
        voltsPerDivision: '20m',
        divisionsPeakToPeak: '3.3',
        readToDivisions: '0.1',
        probeRatio: '10',
        loadOhms: '50',
    };
    await build.keep(stage, output, entry);
}
/** Spreads so many stages over the weeks of the course, evening by evening; the last began `back` nights ago. */
function evenings({ calendar }, count, back) {
    const lastWeek = 1 + back;
    const weeks = 12;
    return (index) => {
        const weeksAgo = index < 0 ? weeks : lastWeek + ((count - 1 - index) * (weeks - 1 - lastWeek)) / Math.max(1, count);
        const day = calendar.nextNight.subtract({ days: Math.round(weeksAgo * 7) });
        return calendar.at(day, index < 0 ? 18 : 19, index < 0 ? 0 : 10);
    };
}
//# sourceMappingURL=builds.js.map