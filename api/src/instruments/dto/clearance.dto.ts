import { ApiProperty } from '@nestjs/swagger';
import { PageQueryDto } from '../../common/paging.dto';
import { IsDay, IsId, MayBeLeftOut } from '../../common/validators';
import type { Clearance } from '../clearance.entity';

export class GrantClearanceDto {
  @IsId()
  personId: string;

  @IsId()
  kindId: string;

  /** Last day on which it holds; leave it out for no end. */
  @MayBeLeftOut()
  @IsDay()
  until?: string;
}

export class ListClearancesQueryDto extends PageQueryDto {
  @MayBeLeftOut()
  @IsId()
  personId?: string;

  @MayBeLeftOut()
  @IsId()
  kindId?: string;
}

/** Who may use a kind of instrument, by whose word, until when. */
export class ClearanceDto {
  id: string;
  personId: string;
  /** @example Tamsin Ardley */
  personName: string;
  kindId: string;
  /** @example Spectrum analyzer */
  kindName: string;
  /** @example Oona Reyes */
  grantedBy: string;
  @ApiProperty({ format: 'date' })
  grantedOn: string;
  @ApiProperty({ type: String, format: 'date', nullable: true })
  until: string | null;
  /** Whether it holds today. */
  holds: boolean;
}

export class ClearancePageDto {
  items: ClearanceDto[];
  total: number;
  page: number;
  perPage: number;
}

export function clearanceDto(clearance: Clearance, today: string): ClearanceDto {
  const { id, personId, person, kindId, kind, grantedBy, grantedOn, until } = clearance;
  return {
    id,
    personId,
    personName: person.name,
    kindId,
    kindName: kind.name,
    grantedBy: grantedBy.name,
    grantedOn,
    until,
    holds: until === null || until >= today,
  };
}
