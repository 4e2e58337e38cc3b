import { applyDecorators } from '@nestjs/common';
import { ApiProperty } from '@nestjs/swagger';
import { ArrayMaxSize, ArrayUnique, IsArray, IsISO8601, IsUUID, Matches, ValidateIf } from 'class-validator';

/** Each id once, and not endlessly many. */
export function AreIds(most: number): PropertyDecorator {
  return applyDecorators(IsArray(), ArrayMaxSize(most), ArrayUnique(), IsUUID('all', { each: true }));
}

/** Calendar days, `2026-10-17`. */
export function AreDays(): PropertyDecorator {
  const message = '$property are days such as 2026-10-17';
  return applyDecorators(
    ApiProperty({ type: [String], format: 'date', required: false }),
    Matches(/^\d{4}-\d{2}-\d{2}$/, { each: true, message }),
    IsISO8601({ strict: true }, { each: true, message }),
  );
}

/** A field that may be left out, though not sent as null. */
export function MayBeLeftOut(): PropertyDecorator {
  return ValidateIf((_body, value) => value !== undefined);
}

export const MOST = { benches: 20, mentors: 10, stages: 30, places: 100, note: 1000 };
