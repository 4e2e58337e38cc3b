import { Injectable } from '@nestjs/common';
import { DataSource, type EntityManager } from 'typeorm';
import { requireMember, type Actor } from '../common/actor';
import { Clock } from '../common/clock';
import { retryingOnce } from '../common/retrying';
import { BuildNightMentor } from './build-night-mentor.entity';
import { nightProblems } from './build-nights.errors';
import { BuildNightsService } from './build-nights.service';
import type { BuildNightDetailDto } from './dto/build-night.dto';
import { NightDesk } from './night-desk';
import { WaitingList } from './waiting-list';

/** Saying that one is coming, and that one is not. */
@Injectable()
export class PlacesService {
  constructor(
    private readonly dataSource: DataSource,
    private readonly nights: BuildNightsService,
    private readonly desk: NightDesk,
    private readonly line: WaitingList,
    private readonly clock: Clock,
  ) {}

  /** Takes a place, or the end of the waiting list when the night is full. Safe to repeat. */
  async come(actor: Actor, nightId: string): Promise<BuildNightDetailDto> {
    requireMember(actor);
    const { personId } = actor;
    const work = async (manager: EntityManager): Promise<void> => {
      const night = await this.desk.open(manager, nightId);
      if (await manager.existsBy(BuildNightMentor, { nightId, personId })) {
        throw nightProblems['night-on-duty']('You are on duty that night, so you are expected anyway.');
      }
      await this.line.join(manager, night, personId, this.clock.now());
    };
    await retryingOnce(() => this.dataSource.transaction(work));
    return this.nights.show(actor, nightId);
  }

  /** Gives the place up; the first in the waiting list moves up and is told. Safe to repeat. */
  async stayAway(actor: Actor, nightId: string): Promise<BuildNightDetailDto> {
    requireMember(actor);
    const work = async (manager: EntityManager): Promise<void> => {
      const night = await this.desk.open(manager, nightId);
      await this.line.leave(manager, night, actor.personId);
    };
    await retryingOnce(() => this.dataSource.transaction(work));
    return this.nights.show(actor, nightId);
  }
}
