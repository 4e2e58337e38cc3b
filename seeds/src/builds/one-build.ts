import { BuildsService } from '@ferrite-row/api/builds/builds.service';
import { LicencesService } from '@ferrite-row/api/builds/licences.service';
import { MarksService } from '@ferrite-row/api/builds/marks.service';
import { PhotosService } from '@ferrite-row/api/builds/photos.service';
import { ReadingsService } from '@ferrite-row/api/builds/readings.service';
import { StageMovesService } from '@ferrite-row/api/builds/stage-moves.service';
import type { PlanCheck } from '@ferrite-row/api/plans/plan-check.entity';
import type { Stage } from '@ferrite-row/api/plans/stage.entity';
import { diceOf, type Dice } from '../dice';
import { picture } from '../pictures';
import type { Inventory, StageSet } from '../stage-set';
import type { Progress } from './progress';
import { entryFor, type Entry } from './typed';
import { nextOffset, plausible } from './values';

const MINUTES_A_CHECK = 9;
/** How far off each try may be; the last comes out where it should. */
const TRIES = [1, 0.5, 0.2];
/** One first try in so many is of a stage not yet trimmed, or of a coil with a turn too few. */
const UNTRIMMED_EVERY = 8;
const UNTRIMMED = 7;
const GRAVE = ['rf power', 'mains', 'rf exposure', 'licence needed'];

export interface PlanStage {
  stage: Stage;
  checks: readonly PlanCheck[];
}

/** One member's evenings at the bench: every reading, mark, photo and word, in the order in which they came. */
export class OneBuild {
  private buildId = '';
  private readonly dice: Dice;
  /** How far the last level read lay from its plan, dB. */
  private offsetDb = 0;
  readings = 0;

  constructor(
    private readonly set: StageSet,
    private readonly inventory: Inventory,
    private readonly progress: Progress,
    private readonly mentor: string,
  ) {
    this.dice = diceOf(`build ${progress.who}`);
  }

  async start(planId: string, at: Date): Promise<void> {
    const { context, clock, as } = this.set;
    clock.set(at);
    this.buildId = (await context.get(BuildsService).start(as(this.progress.who), { planId })).id;
  }

  async showLicence(): Promise<void> {
    const { context, as } = this.set;
    await context.get(LicencesService).see(as('greta'), this.buildId);
  }

  /** Works through the first `count` checks of a stage, beginning at an instant. */
  async work({ stage, checks }: PlanStage, beginning: Date, count = checks.length): Promise<void> {
    for (const [index, check] of checks.slice(0, count).entries()) {
      this.set.clock.set(new Date(beginning.getTime() + index * MINUTES_A_CHECK * 60_000));
      await this.settle(stage, check);
    }
  }

  async submit(stage: Stage, note: string): Promise<void> {
    const { context, clock, as } = this.set;
    clock.set(new Date(clock.now().getTime() + 5 * 60_000));
    await context.get(StageMovesService).submit(as(this.progress.who), this.buildId, stage.id, { note });
  }

  async signOff({ stage, checks }: PlanStage, at: Date, note: string): Promise<void> {
    const { context, clock, as } = this.set;
    clock.set(at);
    for (const { id } of checks.filter(({ kind }) => kind === "mentor's eyes")) {
      await context.get(MarksService).mark(as(this.mentor), this.buildId, id);
    }
    await context.get(StageMovesService).signOff(as(this.mentor), this.buildId, stage.id, { note });
  }

  async sendBack(stage: Stage, at: Date, note: string): Promise<void> {
    const { context, clock, as } = this.set;
    clock.set(at);
    await context.get(StageMovesService).sendBack(as(this.mentor), this.buildId, stage.id, { note });
  }

  /** Keeps one reading exactly as typed. */
  async keep(stage: Stage, check: PlanCheck, entry: Entry): Promise<string> {
    const { context, as } = this.set;
    const body = {
      method: check.method ?? '',
      entry,
      instrumentId: this.instrumentFor(check),
      cautionAcknowledged: stage.cautions.some((caution) => GRAVE.includes(caution)),
    };
    const kept = await context.get(ReadingsService).keep(as(this.progress.who), this.buildId, check.id, body);
    this.readings += 1;
    return kept.verdict ?? '';
  }

  private async settle(stage: Stage, check: PlanCheck): Promise<void> {
    const { context, as } = this.set;
    if (check.kind === 'measure') return this.measure(stage, check);
    if (check.kind === 'photo') {
      const photo = picture(`${this.progress.who} ${check.id}`, stage.position);
      await context
        .get(PhotosService)
        .add(as(this.progress.who), this.buildId, check.id, photo, { caption: check.title });
      return;
    }
    if (check.kind !== "mentor's eyes")
      await context.get(MarksService).mark(as(this.progress.who), this.buildId, check.id);
  }

  /** Tries until it passes, nearer each time, as people do; both tries stay in the record. */
  private async measure(stage: Stage, check: PlanCheck): Promise<void> {
    const before = this.offsetDb;
    const first = this.dice.next() < 1 / UNTRIMMED_EVERY ? [UNTRIMMED] : [];
    for (const care of [...first, ...TRIES]) {
      this.offsetDb = before;
      const entry = entryFor(check, this.valueOf(check, care));
      if (!entry) return;
      const isGood = (await this.keep(stage, check, entry)) === 'pass';
      // A level that happens to pass untrimmed is trimmed all the same: the gains beside it hang on it.
      if (isGood && (care !== UNTRIMMED || check.levelPointId === null)) return;
    }
    throw new Error(`${this.progress.who} cannot get ${check.title} to pass.`);
  }

  /** Levels follow from one another along the signal path; everything else is on its own. */
  private valueOf(check: PlanCheck, care: number): number {
    if (check.levelPointId === null || check.target === null) return plausible(check, this.dice, care);
    this.offsetDb = nextOffset(this.offsetDb, this.dice, care);
    return check.target + this.offsetDb;
  }

  private instrumentFor({ instrumentKindId }: PlanCheck): string | undefined {
    const tags: Record<string, string> = {
      [this.inventory.kind('Oscilloscope')]: this.dice.pick(['FR-021', 'FR-022', 'FR-023']),
      [this.inventory.kind('Spectrum analyzer')]: 'FR-031',
      [this.inventory.kind('Multimeter')]: this.dice.pick(['FR-051', 'FR-054', 'FR-055']),
      [this.inventory.kind('Frequency counter')]: 'FR-034',
      [this.inventory.kind('Dummy load and wattmeter')]: 'FR-060',
      [this.inventory.kind('Log detector')]: 'FR-041',
    };
    const tag = tags[instrumentKindId ?? ''];
    return tag === undefined ? undefined : this.inventory.instrument(tag);
  }
}
