import { Injectable } from '@nestjs/common';
import { DataSource } from 'typeorm';
import { requireRole, type Actor } from '../common/actor';
import { commonProblems } from '../common/common.errors';
import { Club } from './club.entity';
import { openDayDto, type OpenDayDto, type SetOpeningHoursDto } from './dto/opening-hours.dto';
import { OpeningHours } from './opening-hours.entity';
import { hoursProblems, openSpans, type OpenDay } from './opening-hours.rules';

interface Span {
  startsAt: Date;
  endsAt: Date;
}

/** When somebody opens the workshop. A booking outside of it is the person's own affair: some have a key. */
@Injectable()
export class OpeningHoursService {
  constructor(private readonly dataSource: DataSource) {}

  /** Open to everybody, as on the door; Monday first. */
  async week(): Promise<OpenDayDto[]> {
    const days = await this.dataSource.getRepository(OpeningHours).find({ order: { weekday: 'ASC' } });
    return days.map(openDayDto);
  }

  /** An organiser says the whole week at once. */
  async set(actor: Actor, { days }: SetOpeningHoursDto): Promise<void> {
    requireRole(actor, 'organiser');
    const problems = hoursProblems(days);
    const [first] = problems;
    if (first) throw commonProblems['invalid-input'](first.detail, { errors: problems });
    await this.write(days);
  }

  /** For other features: the stretches of a span in which the workshop is open, the whole span when no hours are given. */
  async openWithin(span: Span, zone: string): Promise<Span[]> {
    return openSpans(span, await this.week(), zone);
  }

  /** Two organisers at once queue up at the club's row, so that one of the two weeks stands whole. */
  private async write(days: readonly OpenDay[]): Promise<void> {
    await this.dataSource.transaction(async (manager) => {
      await manager.getRepository(Club).findOne({ where: { id: 1 }, lock: { mode: 'for_no_key_update' } });
      await manager.getRepository(OpeningHours).createQueryBuilder().delete().execute();
      await manager.getRepository(OpeningHours).insert(days.map((day) => ({ ...day })));
    });
  }
}
