import { applyDecorators } from '@nestjs/common';
import { ApiProperty } from '@nestjs/swagger';
import { IsISO8601, Matches } from 'class-validator';

/** Calendar days, `2026-10-17`. */
export function AreDays(): PropertyDecorator {
  const message = '$property are days such as 2026-10-17';
  return applyDecorators(
    ApiProperty({ type: [String], format: 'date', required: false }),
    Matches(/^\d{4}-\d{2}-\d{2}$/, { each: true, message }),
    IsISO8601({ strict: true }, { each: true, message }),
  );
}

export const MOST = { benches: 20, mentors: 10, stages: 30, places: 100, note: 1000 };
