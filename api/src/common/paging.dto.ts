import { Type } from 'class-transformer';
import { IsInt, Max, Min } from 'class-validator';

/** Which part of a long list is wanted. */
export class PageQueryDto {
  @Type(() => Number)
  @IsInt()
  @Min(1)
  @Max(100_000)
  page = 1;

  @Type(() => Number)
  @IsInt()
  @Min(1)
  @Max(200)
  perPage = 50;
}

export function skipOf({ page, perPage }: PageQueryDto): number {
  return (page - 1) * perPage;
}
