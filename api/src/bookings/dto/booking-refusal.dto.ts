import { ProblemDto } from '../../common/problem.dto';
import { UseReasonDto } from '../../instruments/dto/instrument.dto';

export class SpanDto {
  startsAt: Date;
  endsAt: Date;
}

/** Who has it: one line for each bench or instrument that is taken. */
export class TakenDto extends SpanDto {
  resourceId: string;
  /** @example Bench 3 */
  resourceTag: string;
  /** A person's name, or a build night's title. @example Lena Quist */
  by: string;
}

/** 409: somebody has it. Nothing was booked. */
export class BookingOverlapDto extends ProblemDto {
  takenBy: TakenDto[];
  /** Up to three times at which everything wanted is free for as long, the nearest first. */
  nearestFree: SpanDto[];
}

export class RefusedResourceDto {
  resourceId: string;
  reasons: UseReasonDto[];
}

/** 422 `not-bookable`: an instrument may not be used like this, with the reasons and what would help. */
export class NotBookableDto extends ProblemDto {
  refused: RefusedResourceDto[];
}
