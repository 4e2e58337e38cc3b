import { Injectable } from '@nestjs/common';
import { In, type EntityManager } from 'typeorm';
import type { BuildNight } from './build-night.entity';
import { BuildNightPlace } from './build-night-place.entity';
import { NightDesk } from './night-desk';
import { movedUpLetter } from './night-letters.rules';

/** The order in which people come to a night. Each method wants the night's row locked. */
@Injectable()
export class WaitingList {
  constructor(private readonly desk: NightDesk) {}

  /** Takes a place, or the end of the waiting list when there is none. Said twice, it changes nothing. */
  async join(
    manager: EntityManager,
    { id: nightId, places }: BuildNight,
    personId: string,
    saidAt: Date,
  ): Promise<void> {
    const said = await manager.findBy(BuildNightPlace, { nightId });
    if (said.some((place) => place.personId === personId)) return;
    const turn = Math.max(0, ...said.map((place) => place.turn)) + 1;
    const state = said.length < places ? 'coming' : 'waiting';
    await manager.insert(BuildNightPlace, { nightId, personId, state, turn, saidAt });
  }

  /** Gives up a place, or a place in the line. */
  async leave(manager: EntityManager, night: BuildNight, personId: string): Promise<void> {
    await manager.delete(BuildNightPlace, { nightId: night.id, personId });
    await this.moveUp(manager, night);
  }

  /** Fills free places from the waiting list, first come first, and tells those who move up. */
  async moveUp(manager: EntityManager, night: BuildNight): Promise<void> {
    const nightId = night.id;
    const coming = await manager.countBy(BuildNightPlace, { nightId, state: 'coming' });
    const free = night.places - coming;
    if (free <= 0) return;
    const next = await manager.find(BuildNightPlace, {
      where: { nightId, state: 'waiting' },
      order: { turn: 'ASC' },
      take: free,
    });
    if (next.length === 0) return;
    const personIds = next.map(({ personId }) => personId);
    await manager.update(BuildNightPlace, { nightId, personId: In(personIds) }, { state: 'coming' });
    await this.desk.write(manager, personIds, movedUpLetter(night, await this.desk.hall(manager)));
  }
}
