import type { InstrumentFigures } from '@ferrite-row/levels';
import { ApiProperty } from '@nestjs/swagger';
import type { Clearance } from '../clearance.entity';
import { CONDITIONS, figuresOf, type Condition, type Instrument } from '../instrument.entity';
import { REASON_CODES, type UseReason } from '../instruments.rules';

export class InstrumentKindDto {
  id: string;
  /** @example Spectrum analyzer */
  name: string;
  needsClearance: boolean;
  needsCalibration: boolean;
}

/** Why somebody may not use an instrument, and what would help. */
export class UseReasonDto implements UseReason {
  @ApiProperty({ enum: REASON_CODES })
  code: UseReason['code'];
  /** @example The calibration of FR-040 ran out on 20 Oct 2026. */
  reason: string;
  /** @example Choose another signal generator, or ask a steward when it goes for calibration. */
  remedy: string;
}

export class MyClearanceDto {
  @ApiProperty({ format: 'date' })
  grantedOn: string;
  /** Last day on which it holds; null while nobody set an end. */
  @ApiProperty({ type: String, format: 'date', nullable: true })
  until: string | null;
}

/** An instrument, and whether the person asking may book it. */
export class InstrumentDto {
  id: string;
  /** @example FR-031 */
  tag: string;
  /** @example Spectrum analyzer */
  name: string;
  position: number;
  kind: InstrumentKindDto;
  @ApiProperty({ enum: CONDITIONS })
  condition: Condition;
  /** Why it is not ready, or what to mind. */
  conditionNote: string;
  /** Last day on which its calibration holds; null where none is on record. */
  @ApiProperty({ type: String, format: 'date', nullable: true })
  calibrationDueOn: string | null;
  /** The level that harms its input, dBm. */
  @ApiProperty({ type: Number, nullable: true })
  damageLevelDbm: number | null;
  /** ± limit of its level readings, dB. */
  @ApiProperty({ type: Number, nullable: true })
  amplitudeAccuracyDb: number | null;
  /** All that its sheet says and readings are worked out with, by the name the levels package has for it. */
  @ApiProperty({ type: 'object', additionalProperties: { type: 'number' } })
  figures: InstrumentFigures;
  /** Your clearance on its kind, lapsed ones too; null when you have none. */
  @ApiProperty({ type: MyClearanceDto, nullable: true })
  myClearance: MyClearanceDto | null;
  /** Whether you may book it for the day asked about. */
  mayBook: boolean;
  /** Why not; empty when you may. */
  reasons: UseReasonDto[];
}

export class InstrumentPageDto {
  items: InstrumentDto[];
  total: number;
  page: number;
  perPage: number;
}

export class InstrumentDetailDto extends InstrumentDto {
  /** How many members hold a clearance on its kind today. */
  clearedPeople: number;
}

export function instrumentDto(
  instrument: Instrument,
  clearance: Clearance | undefined,
  reasons: UseReason[],
): InstrumentDto {
  const { resource, kind, condition, conditionNote, calibrationDueOn } = instrument;
  const { damageLevelDbm, amplitudeAccuracyDb } = instrument;
  return {
    id: resource.id,
    tag: resource.tag,
    name: resource.name,
    position: resource.position,
    kind,
    condition,
    conditionNote,
    calibrationDueOn,
    damageLevelDbm,
    amplitudeAccuracyDb,
    figures: figuresOf(instrument),
    myClearance: clearance ? { grantedOn: clearance.grantedOn, until: clearance.until } : null,
    mayBook: reasons.length === 0,
    reasons,
  };
}
