import { ApiProperty } from '@nestjs/swagger';
import { CHANGED, type InstrumentChange } from '../instrument-change.entity';

/** One line of an instrument's history. */
export class InstrumentChangeDto {
  id: string;
  changedAt: Date;
  /** @example Oona Reyes */
  changedBy: string;
  @ApiProperty({ enum: CHANGED })
  changed: InstrumentChange['changed'];
  /** A condition or a day; null where none was on record. */
  @ApiProperty({ type: String, nullable: true })
  before: string | null;
  @ApiProperty({ type: String, nullable: true })
  after: string | null;
  note: string;
}

export class InstrumentHistoryDto {
  items: InstrumentChangeDto[];
  total: number;
  page: number;
  perPage: number;
}

export function instrumentChangeDto(change: InstrumentChange): InstrumentChangeDto {
  const { id, changedAt, changedBy, changed, before, after, note } = change;
  return { id, changedAt, changedBy: changedBy.name, changed, before, after, note };
}
