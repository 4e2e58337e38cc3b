import { IsIn, IsString, Matches, MaxLength } from 'class-validator';
import { IsWords } from '../../common/validators';
import { BENCH_FAMILIES, type BenchFamily, type Worksheet } from '../worksheet.entity';

/** A calculation to put on a stage. */
export class PutWorksheetDto {
  @IsIn(BENCH_FAMILIES)
  family: BenchFamily;

  /** The query of the page's address. @example LO=23.067&IF=8.867 */
  @IsString()
  @MaxLength(4000)
  @Matches(/^[\x21-\x7e]*$/, { message: '$property is the query of an address' })
  inputs: string;

  /** The result as plain lines. */
  @IsWords(4000)
  result: string;
}

export class WorksheetDto {
  id: string;
  stageId: string;
  family: BenchFamily;
  inputs: string;
  result: string;
  /** @example 2026-10-15T19:46:00Z */
  at: string;
}

export function worksheetDto({ id, stageId, family, inputs, result, at }: Worksheet): WorksheetDto {
  return { id, stageId, family, inputs, result, at: at.toISOString() };
}
