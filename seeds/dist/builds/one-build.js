"use strict";
Object.defineProperty(exports, "__esModule", { value: true });
exports.OneBuild = void 0;
const builds_service_1 = require("@ferrite-row/api/builds/builds.service");
const marks_service_1 = require("@ferrite-row/api/builds/marks.service");
const photos_service_1 = require("@ferrite-row/api/builds/photos.service");
const readings_service_1 = require("@ferrite-row/api/builds/readings.service");
const stage_moves_service_1 = require("@ferrite-row/api/builds/stage-moves.service");
const dice_1 = require("../dice");
const pictures_1 = require("../pictures");
const typed_1 = require("./typed");
const values_1 = require("./values");
const MINUTES_A_CHECK = 9;
const TRIES = [1, 0.5, 0.2];
const GRAVE = ['rf power', 'mains', 'rf exposure', 'licence needed'];
/** One member's evenings at the bench: every reading, mark, photo and word, in the order in which they came. */
class OneBuild {
    set;
    inventory;
    progress;
    mentor;
    buildId = '';
    dice;
    /** How far the last level read lay from its plan, dB. */
    offsetDb = 0;
    readings = 0;
    constructor(set, inventory, progress, mentor) {
        this.set = set;
        this.inventory = inventory;
        this.progress = progress;
        this.mentor = mentor;
        this.dice = (0, dice_1.diceOf)(`build ${progress.who}`);
    }
    async start(planId, at) {
        const { context, clock, as } = this.set;
        clock.set(at);
        this.buildId = (await context.get(builds_service_1.BuildsService).start(as(this.progress.who), { planId })).id;
    }
    async showLicence() {
        const { context, as } = this.set;
        await context.get(builds_service_1.BuildsService).seeLicence(as('greta'), this.buildId);
    }
    /** Works through the first `count` checks of a stage, beginning at an instant. */
    async work({ stage, checks }, beginning, count = checks.length) {
        for (const [index, check] of checks.slice(0, count).entries()) {
            this.set.clock.set(new Date(beginning.getTime() + index * MINUTES_A_CHECK * 60_000));
            await this.settle(stage, check);
        }
    }
    async submit(stage, note) {
        const { context, clock, as } = this.set;
        clock.set(new Date(clock.now().getTime() + 5 * 60_000));
        await context.get(stage_moves_service_1.StageMovesService).submit(as(this.progress.who), this.buildId, stage.id, { note });
    }
    async signOff({ stage, checks }, at, note) {
        const { context, clock, as } = this.set;
        clock.set(at);
        for (const { id } of checks.filter(({ kind }) => kind === "mentor's eyes")) {
            await context.get(marks_service_1.MarksService).mark(as(this.mentor), this.buildId, id);
        }
        await context.get(stage_moves_service_1.StageMovesService).signOff(as(this.mentor), this.buildId, stage.id, { note });
    }
    async sendBack(stage, at, note) {
        const { context, clock, as } = this.set;
        clock.set(at);
        await context.get(stage_moves_service_1.StageMovesService).sendBack(as(this.mentor), this.buildId, stage.id, { note });
    }
    /** Keeps one reading exactly as typed. */
    async keep(stage, check, entry) {
        const { context, as } = this.set;
        const body = {
            method: check.method ?? '',
            entry,
            instrumentId: this.instrumentFor(check),
            cautionAcknowledged: stage.cautions.some((caution) => GRAVE.includes(caution)),
        };
        const kept = await context.get(readings_service_1.ReadingsService).keep(as(this.progress.who), this.buildId, check.id, body);
        this.readings += 1;
        return kept.verdict ?? '';
    }
    async settle(stage, check) {
        const { context, as } = this.set;
        if (check.kind === 'measure')
            return this.measure(stage, check);
        if (check.kind === 'photo') {
            const photo = (0, pictures_1.picture)(`${this.progress.who} ${check.id}`, stage.position);
            await context
                .get(photos_service_1.PhotosService)
                .add(as(this.progress.who), this.buildId, check.id, photo, { caption: check.title });
            return;
        }
        if (check.kind !== "mentor's eyes")
            await context.get(marks_service_1.MarksService).mark(as(this.progress.who), this.buildId, check.id);
    }
    /** Tries until it passes, nearer each time, as people do; both tries stay in the record. */
    async measure(stage, check) {
        for (const care of TRIES) {
            const entry = (0, typed_1.entryFor)(check, this.valueOf(check, care));
            if (!entry || (await this.keep(stage, check, entry)) === 'pass')
                return;
        }
        throw new Error(`${this.progress.who} cannot get ${check.title} to pass.`);
    }
    /** Levels follow from one another along the signal path; everything else is on its own. */
    valueOf(check, care) {
        if (check.levelPointId === null || check.target === null)
            return (0, values_1.plausible)(check, this.dice, care);
        this.offsetDb = (0, values_1.nextOffset)(this.offsetDb, this.dice, care);
        return check.target + this.offsetDb;
    }
    instrumentFor({ instrumentKindId }) {
        const tags = {
            [this.inventory.kind('Oscilloscope')]: this.dice.pick(['FR-021', 'FR-022', 'FR-023']),
            [this.inventory.kind('Spectrum analyzer')]: 'FR-031',
            [this.inventory.kind('Multimeter')]: this.dice.pick(['FR-051', 'FR-054', 'FR-055']),
            [this.inventory.kind('Frequency counter')]: 'FR-034',
        };
        const tag = tags[instrumentKindId ?? ''];
        return tag === undefined ? undefined : this.inventory.instrument(tag);
    }
}
exports.OneBuild = OneBuild;
//# sourceMappingURL=one-build.js.map