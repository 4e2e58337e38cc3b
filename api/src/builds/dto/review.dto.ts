import { ApiProperty } from '@nestjs/swagger';
import { PageQueryDto } from '../../common/paging.dto';
import { CAUTIONS, type Caution } from '../../plans/stage.entity';
import { PersonRefDto } from './person-ref.dto';

/** Which part of the queue is wanted. */
export class ListReviewsQueryDto extends PageQueryDto {}

/** A stage that waits for a mentor. */
export class ReviewDto {
  buildId: string;
  stageId: string;
  stagePosition: number;
  /** @example IF amplifier */
  stageName: string;
  @ApiProperty({ enum: CAUTIONS, isArray: true })
  cautions: Caution[];
  builder: PersonRefDto;
  /** @example Larkmoor Twenty */
  planName: string;
  serial: number;
  /** @example 2026-01-13T21:48:00Z */
  sentAt: string;
  /** The builder's word. */
  note: string;
  /** How often it was sent back before. */
  timesSentBack: number;
  /** The reader's own stage: another mentor decides on it. */
  isOwn: boolean;
}

export class ReviewsPageDto {
  /** The longest waiting first. */
  items: ReviewDto[];
  total: number;
  page: number;
  perPage: number;
  /** When any stage was signed off last. */
  lastSignOffAt: string | null;
}
