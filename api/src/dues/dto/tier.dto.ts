import { ApiProperty } from '@nestjs/swagger';
import { IsInt, Max, Min } from 'class-validator';
import { IsDay, IsId, IsWords } from '../../common/validators';
import type { Tier } from '../tier.entity';

export class CreateTierDto {
  /** @example full */
  @IsWords(40)
  name: string;

  /** For the whole period. @example 2400 */
  @IsInt()
  @Min(1)
  @Max(10_000_000)
  amountMinor: number;

  /** The months one invoice covers. @example 3 */
  @IsInt()
  @Min(1)
  @Max(12)
  months: number;
}

export class AssignTierDto {
  @IsId()
  personId: string;

  @ApiProperty({ format: 'uuid' })
  @IsId()
  tierId: string;

  /** The first day it holds. */
  @IsDay()
  fromOn: string;
}

export class ComingTierDto {
  tierName: string;
  fromOn: string;
}

/** Somebody of the club, and the tier they are on. */
export class PersonOnTierDto {
  personId: string;
  personName: string;
  /** Today's; null while none was given. */
  tierId: string | null;
  tierName: string | null;
  /** The next change that was set for a later day. */
  coming: ComingTierDto | null;
}

export class PeopleOnTiersPageDto {
  items: PersonOnTierDto[];
  total: number;
  page: number;
  perPage: number;
}

export class TierDto {
  id: string;
  name: string;
  amountMinor: number;
  months: number;
}

export function tierDto({ id, name, amountMinor, months }: Tier): TierDto {
  return { id, name, amountMinor, months };
}
