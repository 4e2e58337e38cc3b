import { ApiProperty } from '@nestjs/swagger';
import { Type } from 'class-transformer';
import {
  ArrayMaxSize,
  ArrayUnique,
  IsArray,
  IsInt,
  IsObject,
  Max,
  Min,
  ValidateNested,
} from 'class-validator';
import type { OpeningHours } from '../opening-hours.entity';

const DAY_MINUTES = 24 * 60;

/** One day of the week on which somebody opens the workshop, by the club's wall clock. */
export class OpenDayDto {
  /** ISO 8601: Monday is 1, Sunday 7. @example 4 */
  @IsInt()
  @Min(1)
  @Max(7)
  weekday: number;

  /** Minutes since midnight. @example 720 */
  @IsInt()
  @Min(0)
  @Max(DAY_MINUTES)
  opensMinute: number;

  /** Minutes since midnight; 1440 is the midnight that ends the day. @example 1320 */
  @IsInt()
  @Min(0)
  @Max(DAY_MINUTES)
  closesMinute: number;
}

/** The club's week. A day that is left out is closed; with no day at all, no hours are given. */
export class SetOpeningHoursDto {
  @ApiProperty({ type: [OpenDayDto], maxItems: 7 })
  @IsArray()
  @ArrayMaxSize(7)
  @ArrayUnique((day: Partial<OpenDayDto> | null) => day?.weekday, {
    message: 'days names a day of the week twice',
  })
  @IsObject({ each: true })
  @ValidateNested({ each: true })
  @Type(() => OpenDayDto)
  days: OpenDayDto[];
}

export const openDayDto = ({ weekday, opensMinute, closesMinute }: OpeningHours): OpenDayDto => ({
  weekday,
  opensMinute,
  closesMinute,
});
