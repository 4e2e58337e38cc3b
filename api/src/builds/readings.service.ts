import { Injectable } from '@nestjs/common';
import { DataSource, type EntityManager } from 'typeorm';
import { requireMember, type Actor } from '../common/actor';
import { Clock } from '../common/clock';
import { commonProblems, fieldError } from '../common/common.errors';
import { figuresOf, type Instrument } from '../instruments/instrument.entity';
import type { PlanCheck } from '../plans/plan-check.entity';
import { PlansService, type EditionContent } from '../plans/plans.service';
import type { Stage } from '../plans/stage.entity';
import { requireBuilder } from './build-access';
import { BuildRecordsService } from './build-records.service';
import type { Build } from './build.entity';
import { judgedColumns, keepDerived, readingsInForce } from './derived-readings';
import { readingDto, type KeepReadingDto, type ReadingDto } from './dto/reading.dto';
import { InstrumentChoiceService } from './instrument-choice.service';
import { heldCheck, openingOf, putOnTheBench, requireOpen } from './open-stage';
import { Reading } from './reading.entity';
import { asksForTick, judgeEntry, type JudgedReading } from './readings.rules';

/** A device's clock may run ahead of the club's by this much; more is a mistake in the form. */
const AHEAD_MS = 2 * 60_000;

@Injectable()
export class ReadingsService {
  constructor(
    private readonly dataSource: DataSource,
    private readonly plans: PlansService,
    private readonly records: BuildRecordsService,
    private readonly instruments: InstrumentChoiceService,
    private readonly clock: Clock,
  ) {}

  /**
   * Keeps a reading as typed, with what it comes to; a retake is added beside the one before. Whatever works itself out
   * of it is worked out in the same transaction.
   *
   * @throws DomainError `invalid-input` (422) naming the field, `stage-locked` or `stage-out-of-hand` (409)
   */
  async keep(actor: Actor, buildId: string, checkId: string, body: KeepReadingDto): Promise<ReadingDto> {
    requireMember(actor);
    const keptAt = this.clock.now();
    return this.dataSource.transaction(async (manager) => {
      const build = requireBuilder(actor, await this.records.hold(manager, buildId));
      const edition = await this.plans.content(build.editionId, manager);
      const held = await heldCheck(manager, build, edition, checkId);
      requireOpen(build, edition, held);
      const { stage, check, states } = held;
      if (check.kind !== 'measure') throw fieldError('method', 'This check is not a measurement.');
      if (asksForTick(stage.cautions) && body.cautionAcknowledged !== true)
        throw fieldError('cautionAcknowledged', 'Tick the caution before the reading is kept.');
      const takenAt = await this.takenAt(manager, build, edition, stage, body, keptAt);
      const instrument = await this.instrumentOf(manager, build, check, body, takenAt);
      const judged = judgedOrRefused(check, body, instrument);
      const reading = await this.insert(manager, build, check, { body, judged, instrument, takenAt, keptAt });
      await putOnTheBench(manager, build, stage);
      await keepDerived(manager, build, edition, states, checkId, keptAt);
      const inForce = await readingsInForce(manager, build.id, [checkId]);
      return readingDto(reading, inForce.get(checkId)?.id);
    });
  }

  private async instrumentOf(
    manager: EntityManager,
    build: Build,
    check: PlanCheck,
    { instrumentId }: KeepReadingDto,
    takenAt: Date,
  ): Promise<Instrument | undefined> {
    if (instrumentId !== undefined)
      return this.instruments.fitFor(manager, build.personId, check, instrumentId, takenAt);
    if (check.instrumentKindId !== null) await this.instruments.askFor(manager, check.instrumentKindId);
    return undefined;
  }

  /** When it was taken: not in the time to come, and not before the stage could be worked on. */
  private async takenAt(
    manager: EntityManager,
    build: Build,
    edition: EditionContent,
    stage: Stage,
    { takenAt }: KeepReadingDto,
    now: Date,
  ): Promise<Date> {
    if (takenAt === undefined) return now;
    const instant = new Date(takenAt);
    if (instant.getTime() > now.getTime() + AHEAD_MS) throw fieldError('takenAt', 'That is still to come.');
    if (instant < (await openingOf(manager, build, edition, stage)))
      throw fieldError('takenAt', `That was before ${stage.name} could be begun.`);
    return instant > now ? now : instant;
  }

  private async insert(
    manager: EntityManager,
    build: Build,
    check: PlanCheck,
    { body, judged, instrument, takenAt, keptAt }: KeptReading,
  ): Promise<Reading> {
    const reading = manager.create(Reading, {
      ...judgedColumns(judged),
      ...{ buildId: build.id, stageId: check.stageId, checkId: check.id, byPersonId: build.personId },
      ...{ method: body.method, entry: body.entry, fromReadingIds: [], takenAt, keptAt },
      instrumentId: instrument?.resourceId ?? null,
      instrumentTag: instrument?.resource.tag ?? null,
      calibrationDueOn: instrument?.calibrationDueOn ?? null,
      cautionAcknowledged: body.cautionAcknowledged ?? false,
    });
    await manager.insert(Reading, reading);
    return reading;
  }
}

interface KeptReading {
  body: KeepReadingDto;
  judged: JudgedReading;
  instrument: Instrument | undefined;
  takenAt: Date;
  keptAt: Date;
}

function judgedOrRefused(
  check: PlanCheck,
  { method, entry }: KeepReadingDto,
  instrument: Instrument | undefined,
): JudgedReading {
  const judgement = judgeEntry(check, method, entry, instrument && figuresOf(instrument));
  if (!('problems' in judgement)) return judgement;
  const { problems } = judgement;
  const detail = problems[0]?.detail ?? 'The reading cannot be worked out.';
  throw commonProblems['invalid-input'](detail, { errors: problems });
}
