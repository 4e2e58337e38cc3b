import { IsOptional, IsUUID } from 'class-validator';
import { IsInstant } from '../../common/validators';

/** A stretch of at most 62 days; what touches it is listed. */
export class ListBookingsQueryDto {
  @IsInstant()
  from: string;

  @IsInstant()
  to: string;

  /** Only bookings that hold this bench or instrument. */
  @IsOptional()
  @IsUUID()
  resourceId?: string;
}
