import { ApiPropertyOptional } from '@nestjs/swagger';
import { Type } from 'class-transformer';
import { IsInt, Max, Min } from 'class-validator';

/** Which part of a long list is wanted. */
export class PageQueryDto {
  // Said by hand: the plugin reads a default as a required object.
  @ApiPropertyOptional({ type: Number, default: 1 })
  @Type(() => Number)
  @IsInt()
  @Min(1)
  @Max(100_000)
  page = 1;

  @ApiPropertyOptional({ type: Number, default: 50 })
  @Type(() => Number)
  @IsInt()
  @Min(1)
  @Max(200)
  perPage = 50;
}

export function skipOf({ page, perPage }: PageQueryDto): number {
  return (page - 1) * perPage;
}
