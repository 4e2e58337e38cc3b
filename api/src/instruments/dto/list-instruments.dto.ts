import { PageQueryDto } from '../../common/paging.dto';
import { IsDay, IsId, MayBeLeftOut } from '../../common/validators';

/** For which day the instrument would be used; today unless told. */
export class UseDayQueryDto {
  @MayBeLeftOut()
  @IsDay()
  on?: string;
}

export class ListInstrumentsQueryDto extends PageQueryDto {
  /** Only instruments of this kind. */
  @MayBeLeftOut()
  @IsId()
  kindId?: string;

  /** For which day the instrument would be used; today unless told. */
  @MayBeLeftOut()
  @IsDay()
  on?: string;
}
