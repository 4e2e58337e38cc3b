import { ApiProperty } from '@nestjs/swagger';
import type { Person } from '../../people/person.entity';
import { IsWords, MayBeLeftOut } from '../../common/validators';
import type { PhotoFacts } from '../build-record';
import type { CheckMark } from '../check-mark.entity';
import { personRef, PersonRefDto } from './person-ref.dto';

/** A tick, a safety check acknowledged, or what a mentor saw. */
export class MarkDto {
  id: string;
  by: PersonRefDto;
  /** @example 2026-01-15T19:46:00Z */
  at: string;
}

export function markDto({ id, byPersonId, at }: CheckMark, people: ReadonlyMap<string, Person>): MarkDto {
  return { id, by: personRef(people, byPersonId), at: at.toISOString() };
}

/** Goes with the picture in the form. */
export class AddPhotoDto {
  /** @example Underside, joints */
  @MayBeLeftOut()
  @IsWords(120, 0)
  caption?: string;
}

export class PhotoDto {
  id: string;
  caption: string;
  /** @example image/jpeg */
  contentType: string;
  /** @example 2026-01-15T19:46:00Z */
  at: string;
  /** Where its bytes are. @example /api/builds/…/photos/… */
  url: string;
}

export function photoDto({ id, buildId, caption, contentType, at }: PhotoFacts): PhotoDto {
  return { id, caption, contentType, at: at.toISOString(), url: `/api/builds/${buildId}/photos/${id}` };
}

/** An instrument a check could be taken with. */
export class InstrumentChoiceDto {
  id: string;
  /** @example FR-021 */
  tag: string;
  name: string;
  /** @example Oscilloscope */
  kind: string;
  /** Why it cannot be chosen; null when it can. */
  @ApiProperty({ type: String, nullable: true })
  reason: string | null;
  /** Last day of its calibration. */
  calibrationDueOn: string | null;
  /** The level that harms its input, dBm. */
  damageLevelDbm: number | null;
  /** What its sheet says and readings are worked out with, by the name the levels package has for it. */
  @ApiProperty({ type: 'object', additionalProperties: { type: 'number' } })
  figures: Record<string, number>;
}
