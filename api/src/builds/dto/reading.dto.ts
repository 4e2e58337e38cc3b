import { ApiProperty } from '@nestjs/swagger';
import { IsBoolean, IsObject } from 'class-validator';
import { IsId, IsInstant, IsWords, MayBeLeftOut } from '../../common/validators';
import { VERDICTS, type KeptVerdict, type Reading } from '../reading.entity';

/** A reading as it was typed. What it comes to is worked out here and nowhere else. */
export class KeepReadingDto {
  /** How it was taken; the check's own method. @example oscilloscope */
  @IsWords(40)
  method: string;

  /** Word for word as typed, by field. @example { "voltsPerDivision": "20m", "divisionsPeakToPeak": "3.3" } */
  @ApiProperty({ type: 'object', additionalProperties: { type: 'string' } })
  @IsObject()
  entry: Record<string, string>;

  /** What it was read on; asked for where the check names a kind of instrument. */
  @MayBeLeftOut()
  @IsId()
  instrumentId?: string;

  /** When it was taken, for one that waited on a device; now where left out. Not before the stage opened. */
  @MayBeLeftOut()
  @IsInstant()
  takenAt?: string;

  /** The tick beside a grave caution; asked for with every reading of such a stage. */
  @MayBeLeftOut()
  @IsBoolean()
  cautionAcknowledged?: boolean;
}

export class UncertaintyComponentDto {
  /** @example reading resolution */
  name: string;
  limit: number;
  distribution: string;
  standardUncertainty: number;
}

export class ReadingDto {
  id: string;
  checkId: string;
  /** @example oscilloscope */
  method: string;
  @ApiProperty({ type: 'object', additionalProperties: { type: 'string' } })
  entry: Record<string, string>;
  /** In `unit`, unrounded. */
  value: number;
  /** @example dBm */
  unit: string;
  /** Unit of the uncertainties: dB for dBm and dBc. */
  uncertaintyUnit: string;
  /** k = 2, about 95 %. */
  expandedUncertainty: number;
  components: UncertaintyComponentDto[];
  voltsPeakToPeak: number | null;
  watts: number | null;
  @ApiProperty({ enum: VERDICTS })
  verdict: KeptVerdict;
  /** Name and version of the calculation. @example oscilloscope/1 */
  calculation: string;
  instrumentId: string | null;
  /** @example FR-021 */
  instrumentTag: string | null;
  /** Last day of the instrument's calibration, as it was then. */
  calibrationDueOn: string | null;
  cautionAcknowledged: boolean;
  /** @example 2026-01-15T19:46:00Z */
  takenAt: string;
  /** A later one is in force; this one stays in the record. */
  isSuperseded: boolean;
}

export function readingDto(reading: Reading, inForce: string | undefined): ReadingDto {
  const { id, checkId, method, entry, value, unit, uncertaintyUnit, expandedUncertainty } = reading;
  const { components, voltsPeakToPeak, watts, verdict, calculation, cautionAcknowledged } = reading;
  const { instrumentId, instrumentTag, calibrationDueOn } = reading;
  return {
    ...{ id, checkId, method, entry, value, unit, uncertaintyUnit, expandedUncertainty },
    ...{ components, voltsPeakToPeak, watts, verdict, calculation, cautionAcknowledged },
    ...{ instrumentId, instrumentTag, calibrationDueOn },
    takenAt: reading.takenAt.toISOString(),
    isSuperseded: inForce !== undefined && inForce !== id,
  };
}
