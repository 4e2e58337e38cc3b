import { IsIn } from 'class-validator';
import { ROLES, type Role } from '../../common/actor';
import { PageQueryDto } from '../../common/paging.dto';
import { IsWords, MayBeLeftOut } from '../../common/validators';
import { PersonDto } from './person.dto';

export class ListPeopleQueryDto extends PageQueryDto {
  /** Only holders of this role. */
  @MayBeLeftOut()
  @IsIn(ROLES)
  role?: Role;

  /** Only names that have these letters in them. */
  @MayBeLeftOut()
  @IsWords(80)
  name?: string;
}

export class PeoplePageDto {
  items: PersonDto[];
  total: number;
  page: number;
  perPage: number;
}
