import { Injectable } from '@nestjs/common';
import { DataSource, type EntityManager } from 'typeorm';
import { BookingsService } from '../bookings/bookings.service';
import { ClubService } from '../club/club.service';
import { requireRole, type Actor } from '../common/actor';
import { Clock } from '../common/clock';
import { notFound } from '../common/common.errors';
import { translatingConstraints } from '../common/constraint';
import { retryingOnce } from '../common/retrying';
import { BuildNight } from './build-night.entity';
import { BuildNightMentor } from './build-night-mentor.entity';
import { BuildNightPlace } from './build-night-place.entity';
import { BuildNightsRepository } from './build-nights.repository';
import { nightProblems } from './build-nights.errors';
import { BuildNightsService } from './build-nights.service';
import { changedNight } from './change.rules';
import type { BuildNightDetailDto } from './dto/build-night.dto';
import type { CancelNightDto, ChangeNightDto } from './dto/change-night.dto';
import { NightCheck } from './night-check';
import { NightDesk } from './night-desk';
import { cancelledLetter, changedLetter } from './night-letters.rules';
import { NightWriter } from './night-writer';
import { WaitingList } from './waiting-list';

/** Changing and cancelling one night. */
@Injectable()
export class NightChangesService {
  constructor(
    private readonly dataSource: DataSource,
    private readonly nights: BuildNightsRepository,
    private readonly reading: BuildNightsService,
    private readonly looking: NightCheck,
    private readonly writer: NightWriter,
    private readonly line: WaitingList,
    private readonly bookings: BookingsService,
    private readonly desk: NightDesk,
    private readonly club: ClubService,
    private readonly clock: Clock,
  ) {}

  /** Other times, places, mentors, benches or words. Times, benches and mentors are looked at again for clashes. */
  async change(actor: Actor, nightId: string, change: ChangeNightDto): Promise<BuildNightDetailDto> {
    requireRole(actor, 'mentor');
    const { benchIds = [], mentorIds = [], stageIds = [] } = change;
    await this.looking.refuseUnknown({ benchIds, mentorIds, stageIds });
    const look = await this.lookAgain(nightId, change);
    if (look.after.isElsewhere) await this.looking.refuseClashes(...look.wanted);
    const lostRace = () => this.looking.lostRace(...look.wanted);
    const work = () => this.dataSource.transaction((manager) => this.write(manager, actor, nightId, change));
    await translatingConstraints(() => retryingOnce(work), {
      booking_no_overlap: lostRace,
      build_night_mentor_on_one_duty: lostRace,
      build_night_place_kept: () => tooFewPlaces(),
    });
    return this.reading.show(actor, nightId);
  }

  /** Gives back the benches and the mentors, and tells everybody who was coming, who waited and who was on duty. */
  async cancel(actor: Actor, nightId: string, { reason }: CancelNightDto): Promise<BuildNightDetailDto> {
    requireRole(actor, 'mentor');
    const work = async (manager: EntityManager): Promise<void> => {
      const night = await this.desk.open(manager, nightId);
      const cancelledAt = this.clock.now();
      await manager.update(BuildNight, { id: nightId }, { cancelledAt, cancelledReason: reason });
      await manager.update(BuildNightMentor, { nightId }, { releasedAt: cancelledAt });
      if (night.bookingId) await this.bookings.releaseForNight(manager, night.bookingId, actor.personId);
      const [guests, mentors] = [
        await manager.findBy(BuildNightPlace, { nightId }),
        await manager.findBy(BuildNightMentor, { nightId }),
      ];
      const told = new Set([...guests, ...mentors].map(({ personId }) => personId));
      told.delete(actor.personId);
      await this.desk.write(
        manager,
        [...told],
        cancelledLetter(night, reason, await this.desk.hall(manager)),
      );
    };
    await retryingOnce(() => this.dataSource.transaction(work));
    return this.reading.show(actor, nightId);
  }

  private async lookAgain(nightId: string, change: ChangeNightDto) {
    const { timeZone } = await this.club.settings();
    const record = await this.nights.byId(nightId);
    if (!record) throw notFound('build night');
    const { bookingId } = record.night;
    const after = changedNight(record, change, timeZone, this.clock.now());
    const except = { nightIds: [nightId], bookingIds: bookingId ? [bookingId] : [] };
    return { after, wanted: [[after], timeZone, except] as const };
  }

  /** The change is worked out anew on the locked night, so that two changes at once lose nothing of each other. */
  private async write(
    manager: EntityManager,
    actor: Actor,
    nightId: string,
    change: ChangeNightDto,
  ): Promise<void> {
    const night = await this.desk.open(manager, nightId);
    const record = await this.nights.byId(nightId, manager);
    if (!record) throw notFound('build night');
    const hall = await this.desk.hall(manager);
    const after = changedNight(record, change, hall.zone, this.clock.now());
    await this.writer.rewrite(manager, night, after, actor.personId);
    const { title, places, note, startsAt, endsAt } = after;
    const changed = { ...night, title, places, note, startsAt, endsAt };
    await this.line.moveUp(manager, changed);
    const before = record.mentors.map(({ personId }) => personId);
    const added = after.mentorIds.filter((id) => !before.includes(id));
    await this.desk.tellMentors(manager, actor, [{ night: changed, mentorIds: added }]);
    if (!after.hasOtherTimes) return;
    const told = new Set([...record.places.map(({ personId }) => personId), ...before]);
    told.delete(actor.personId);
    await this.desk.write(manager, [...told], changedLetter(night, changed, hall));
  }
}

function tooFewPlaces() {
  return nightProblems['night-places-taken'](
    'More people are coming than that. They keep their places; ask somebody to give one up first.',
  );
}
