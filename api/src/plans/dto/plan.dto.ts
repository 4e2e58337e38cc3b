import { PageQueryDto } from '../../common/paging.dto';

/** Which plans are wanted. */
export class ListPlansQueryDto extends PageQueryDto {}

export class PlanDto {
  id: string;
  /** @example Larkmoor Twenty */
  name: string;
  summary: string;
  /** Numbers of its published editions, oldest first. */
  editions: number[];
}

export class PlansPageDto {
  items: PlanDto[];
  total: number;
  page: number;
  perPage: number;
}
