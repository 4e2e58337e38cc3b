import { IsInstant } from '../../common/validators';

/** At most 100 days. */
export class ListNightsQueryDto {
  /** Nights that end after this. */
  @IsInstant()
  from: string;

  /** Nights that begin before this. */
  @IsInstant()
  to: string;
}
