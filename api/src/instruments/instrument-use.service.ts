import { Injectable } from '@nestjs/common';
import { In, type EntityManager } from 'typeorm';
import { ClubService } from '../club/club.service';
import { Clock } from '../common/clock';
import { clubDay, endOfDay } from '../common/club-day';
import { ClearancesService } from './clearances.service';
import type { Clearance } from './clearance.entity';
import { Instrument } from './instrument.entity';
import { reasonsAgainst, usableUntil, type UseFacts, type UseReason } from './instruments.rules';

export { lower, type UseReason } from './instruments.rules';

/** What the rules say about some benches and instruments for one person and time. */
export interface Judgement {
  /** By the id of the bench or instrument; those without reasons are not in it. */
  reasons: Map<string, UseReason[]>;
  /** After this instant a calibration or clearance among them is over; undefined when none has an end. */
  usableUntil: Date | undefined;
}

/** For bookings: may this person use these instruments then? */
@Injectable()
export class InstrumentUseService {
  constructor(
    private readonly clearances: ClearancesService,
    private readonly club: ClubService,
    private readonly clock: Clock,
  ) {}

  async judge(
    manager: EntityManager,
    personId: string,
    resourceIds: readonly string[],
    endsAt: Date,
  ): Promise<Judgement> {
    const zone = (await this.club.settings(manager)).timeZone;
    const instruments = await manager
      .getRepository(Instrument)
      .find({ where: { resourceId: In([...resourceIds]) }, relations: { resource: true, kind: true } });
    const kindIds = instruments.map(({ kindId }) => kindId);
    const held = await this.clearances.heldBy(personId, kindIds, manager);
    const facts = instruments.map((instrument) => factsOf(instrument, held.get(instrument.kindId)));
    // The end is not part of the use: one that ends at midnight does not touch the next day.
    const days = {
      today: clubDay(this.clock.now(), zone),
      lastDay: clubDay(new Date(endsAt.getTime() - 1), zone),
    };
    const judged = instruments.map(({ resourceId }, index) => {
      const fact = facts[index];
      return [resourceId, fact ? reasonsAgainst(fact, days) : []] as const;
    });
    const ends = facts.map(usableUntil).filter((day) => day !== undefined);
    const first = ends.sort()[0];
    return {
      reasons: new Map(judged.filter(([, reasons]) => reasons.length > 0)),
      usableUntil: first === undefined ? undefined : endOfDay(first, zone),
    };
  }
}

export function factsOf(instrument: Instrument, clearance: Clearance | undefined): UseFacts {
  const { resource, kind, condition, conditionNote, calibrationDueOn } = instrument;
  const { needsClearance, needsCalibration, name: kindName } = kind;
  const { tag } = resource;
  return {
    tag,
    kindName,
    needsClearance,
    needsCalibration,
    condition,
    conditionNote,
    calibrationDueOn,
    clearance,
  };
}
