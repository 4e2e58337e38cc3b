import { ArrayMinSize } from 'class-validator';
import { AreIds, IsId, IsInstant, MayBeLeftOut } from '../../common/validators';

const MOST_RESOURCES = 8;

export class CreateBookingDto {
  /** Benches and instruments, 1 to 8: all of them are booked, or none. */
  @ArrayMinSize(1, { message: 'Choose at least one bench or instrument' })
  @AreIds(MOST_RESOURCES, {
    tooMany: 'One booking holds at most 8 benches and instruments',
    twice: 'One bench or instrument stands in the list twice',
  })
  resourceIds: string[];

  @IsInstant()
  startsAt: string;

  @IsInstant()
  endsAt: string;

  /** Book it for one of your groups. */
  @MayBeLeftOut()
  @IsId()
  groupId?: string;

  /** The check of the plan you will work on. */
  @MayBeLeftOut()
  @IsId()
  checkId?: string;
}
