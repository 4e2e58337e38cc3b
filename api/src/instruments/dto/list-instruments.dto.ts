import { IsOptional, IsUUID } from 'class-validator';
import { PageQueryDto } from '../../common/paging.dto';
import { IsDay } from '../../common/validators';

/** For which day the instrument would be used; today unless told. */
export class UseDayQueryDto {
  @IsOptional()
  @IsDay()
  on?: string;
}

export class ListInstrumentsQueryDto extends PageQueryDto {
  /** Only instruments of this kind. */
  @IsOptional()
  @IsUUID()
  kindId?: string;

  /** For which day the instrument would be used; today unless told. */
  @IsOptional()
  @IsDay()
  on?: string;
}
