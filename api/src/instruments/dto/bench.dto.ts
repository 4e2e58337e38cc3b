import type { Resource } from '../resource.entity';

/** A bench that can be booked. */
export class BenchDto {
  id: string;
  /** @example Bench 3 */
  tag: string;
  /** @example By the window */
  name: string;
  /** Order on the page. */
  position: number;
}

export class BenchPageDto {
  items: BenchDto[];
  total: number;
  page: number;
  perPage: number;
}

export function benchDto({ id, tag, name, position }: Resource): BenchDto {
  return { id, tag, name, position };
}
