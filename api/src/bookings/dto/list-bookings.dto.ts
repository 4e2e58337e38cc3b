import { IsId, IsInstant, MayBeLeftOut } from '../../common/validators';

/** A stretch of at most 62 days; what touches it is listed. */
export class ListBookingsQueryDto {
  @IsInstant()
  from: string;

  @IsInstant()
  to: string;

  /** Only bookings that hold this bench or instrument. */
  @MayBeLeftOut()
  @IsId()
  resourceId?: string;
}
