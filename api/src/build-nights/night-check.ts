import { Injectable } from '@nestjs/common';
import { BookingsService } from '../bookings/bookings.service';
import { fieldError } from '../common/common.errors';
import type { DomainError } from '../common/domain-error';
import { dayWords } from '../common/wall-clock';
import { PeopleService } from '../people/people.service';
import { nightProblems } from './build-nights.errors';
import { BuildNightsRepository } from './build-nights.repository';
import { checkNights } from './clash.rules';
import type { CheckedNightDto } from './dto/planned-nights.dto';
import { listText } from './night-words.rules';
import type { WantedNight } from './plan.rules';

/** The night that is being changed: its own benches and mentors are not in its way. */
interface Except {
  nightIds: string[];
  bookingIds: string[];
}

interface Asked {
  benchIds: readonly string[];
  mentorIds: readonly string[];
  stageIds: readonly string[];
}

const NOTHING: Except = { nightIds: [], bookingIds: [] };

/** Looks for what is in the way of wanted nights. */
@Injectable()
export class NightCheck {
  constructor(
    private readonly nights: BuildNightsRepository,
    private readonly bookings: BookingsService,
    private readonly people: PeopleService,
  ) {}

  async check(nights: readonly WantedNight[], zone: string, except = NOTHING): Promise<CheckedNightDto[]> {
    const [benches, mentors] = await Promise.all([this.nights.benches(), this.people.holding('mentor')]);
    const [benchIds, mentorIds] = [benches.map(({ id }) => id), mentors.map(({ id }) => id)];
    const [taken, duties] = await Promise.all([
      this.bookings.findClashes(benchIds, nights, { exceptBookingIds: except.bookingIds }),
      this.nights.duties(nights, except.nightIds),
    ]);
    return checkNights(nights, { zone, benchIds, mentorIds, taken, duties });
  }

  /** @throws DomainError `invalid-input` when something asked for is not there. */
  async refuseUnknown(asked: Asked): Promise<void> {
    const [benches, mentors, stages] = await Promise.all([
      this.nights.benches(),
      this.people.holding('mentor'),
      this.nights.stages(asked.stageIds),
    ]);
    const isUnknown = (ids: readonly string[], known: readonly { id: string }[]) =>
      ids.some((id) => !known.some((one) => one.id === id));
    if (isUnknown(asked.benchIds, benches))
      throw fieldError('benchIds', 'One of these is no bench of the club.');
    if (isUnknown(asked.mentorIds, mentors))
      throw fieldError('mentorIds', 'One of these is no mentor of the club.');
    if (isUnknown(asked.stageIds, stages))
      throw fieldError('stageIds', 'One of these is no stage of a plan.');
  }

  /** @throws DomainError `night-clash` that names each date and its reason. */
  async refuseClashes(nights: readonly WantedNight[], zone: string, except = NOTHING): Promise<void> {
    const checked = await this.check(nights, zone, except);
    if (checked.some(({ verdict }) => verdict === 'clash')) throw clashProblem(checked, zone);
  }

  /** For a lost race: what the database refused, in the words of a second look. */
  async lostRace(nights: readonly WantedNight[], zone: string, except = NOTHING): Promise<DomainError> {
    return clashProblem(await this.check(nights, zone, except), zone);
  }
}

function clashProblem(checked: readonly CheckedNightDto[], zone: string): DomainError {
  const clashes = checked.filter(({ verdict }) => verdict === 'clash');
  const days = listText(clashes.map(({ startsAt }) => dayWords(startsAt, zone)));
  const detail =
    clashes.length === 0
      ? 'Somebody was a moment quicker with a bench or a mentor. Nothing was changed. Try again.'
      : `${days} ${clashes.length === 1 ? 'clashes' : 'clash'}, so nothing was changed.`;
  return nightProblems['night-clash'](detail, { extra: { clashes } });
}
