import { clubDay } from '../common/club-day';
import type { NightRecord } from './build-nights.repository';
import type { ChangeNightDto } from './dto/change-night.dto';
import { readTimes, someMentor, type WantedNight } from './plan.rules';

/** A night as it is to be. */
export interface ChangedNight extends WantedNight {
  title: string;
  places: number;
  note: string;
  stageIds: string[];
  hasOtherTimes: boolean;
  /** Its times or benches are others, so that the bench book is written anew. */
  isHeldOtherwise: boolean;
  /** Its times, benches or mentors are others, so that it may clash. */
  isElsewhere: boolean;
}

/**
 * What a change makes of a night.
 *
 * @throws DomainError `invalid-input` when the new times are not sensible; times that stay are not looked at again.
 */
export function changedNight(
  { night, benches, mentors, stages }: NightRecord,
  change: ChangeNightDto,
  zone: string,
  now: Date,
): ChangedNight {
  const hasOtherTimes = change.startsAt !== undefined || change.endsAt !== undefined;
  const times = hasOtherTimes ? readTimes(textTimes(night, change), now) : night;
  const { startsAt, endsAt } = times;
  return {
    date: clubDay(startsAt, zone),
    ...{ startsAt, endsAt, hasOtherTimes },
    title: change.title ?? night.title,
    places: change.places ?? night.places,
    note: change.note ?? night.note,
    benchIds: change.benchIds ?? benches.map(({ resourceId }) => resourceId),
    mentorIds: someMentor(change.mentorIds ?? mentors.map(({ personId }) => personId)),
    stageIds: change.stageIds ?? stages.map(({ stageId }) => stageId),
    isLeftOut: false,
    isHeldOtherwise: hasOtherTimes || change.benchIds !== undefined,
    isElsewhere: hasOtherTimes || change.benchIds !== undefined || change.mentorIds !== undefined,
  };
}

function textTimes(
  night: { startsAt: Date; endsAt: Date },
  { startsAt, endsAt }: ChangeNightDto,
): { startsAt: string; endsAt: string } {
  return {
    startsAt: startsAt ?? night.startsAt.toISOString(),
    endsAt: endsAt ?? night.endsAt.toISOString(),
  };
}
