import { IntersectionType, PartialType } from '@nestjs/swagger';
import { Type } from 'class-transformer';
import {
  ArrayMaxSize,
  IsArray,
  IsBoolean,
  IsInt,
  IsObject,
  IsString,
  Max,
  MaxLength,
  Min,
  ValidateNested,
} from 'class-validator';
import { AreIds, IsDay, IsInstant, IsWords, MayBeLeftOut } from '../../common/validators';
import { MOST_NIGHTS } from '../repeat.rules';
import { AreDays, MOST } from './night-fields';

/** How a series goes on after its first night. */
export class RepeatDto {
  /**
   * An RRULE of RFC 5545 without its name: FREQ=WEEKLY with INTERVAL, BYDAY and either COUNT (at most 60) or UNTIL in
   * UTC. It is read on the club's wall clock, so that 19:30 stays 19:30 when the clocks change.
   * @example FREQ=WEEKLY;BYDAY=TU;COUNT=6
   */
  @IsString()
  @MaxLength(200)
  rule: string;
}

/** What is different on one night of a series. */
export class InsteadDto {
  /** The night's day on the club's calendar. @example 2026-10-20 */
  @IsDay()
  date: string;

  @MayBeLeftOut()
  @AreIds(MOST.benches)
  benchIds?: string[];

  @MayBeLeftOut()
  @AreIds(MOST.mentors)
  mentorIds?: string[];
}

/** When, and with whom and what. */
export class NightTimesDto {
  /** The first night's beginning; for a series its time on the club's wall is kept. */
  @IsInstant()
  startsAt: string;

  /** The first night's end: 15 minutes to 12 hours later. */
  @IsInstant()
  endsAt: string;

  /** Left out for a single night. */
  @MayBeLeftOut()
  @IsObject()
  @ValidateNested()
  @Type(() => RepeatDto)
  repeat?: RepeatDto;

  /** Days to leave out of the series (EXDATE). A day that is no night of it changes nothing. */
  @MayBeLeftOut()
  @IsArray()
  @ArrayMaxSize(MOST_NIGHTS)
  @AreDays()
  skip?: string[];

  /** Nights of the series that have other benches or mentors. A day that is no night of it changes nothing. */
  @MayBeLeftOut()
  @IsArray()
  @ArrayMaxSize(MOST_NIGHTS)
  @ValidateNested({ each: true })
  @Type(() => InsteadDto)
  instead?: InsteadDto[];

  /** Benches the night holds; none for an evening without. */
  @MayBeLeftOut()
  @AreIds(MOST.benches)
  benchIds?: string[];

  /** Mentors on duty, at least one. Left out: whoever schedules it. */
  @MayBeLeftOut()
  @AreIds(MOST.mentors)
  mentorIds?: string[];

  /** Stages in focus. */
  @MayBeLeftOut()
  @AreIds(MOST.stages)
  stageIds?: string[];
}

/** What it is called and how many may come. */
export class NightWordsDto {
  /** @example Winding evenings */
  @IsWords(80)
  title: string;

  @IsInt()
  @Min(1)
  @Max(MOST.places)
  places: number;

  @MayBeLeftOut()
  @IsWords(MOST.note, 0)
  note?: string;

  /** Tells the people whose build is on one of the stages in focus. */
  @MayBeLeftOut()
  @IsBoolean()
  tellByMail?: boolean;
}

/** One night or a series of them. */
export class PlanNightsDto extends IntersectionType(NightTimesDto, NightWordsDto) {}

/** The same, half typed: what is not needed to look for clashes may be missing. */
export class PreviewNightsDto extends IntersectionType(
  NightTimesDto,
  PartialType(NightWordsDto, { skipNullProperties: false }),
) {}
