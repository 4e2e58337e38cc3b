import { applyDecorators } from '@nestjs/common';
import { ApiProperty } from '@nestjs/swagger';
import { Transform } from 'class-transformer';
import {
  ArrayMaxSize,
  ArrayUnique,
  IsArray,
  IsISO8601,
  IsString,
  Matches,
  MaxLength,
  MinLength,
  ValidateBy,
  ValidateIf,
} from 'class-validator';
import { ID } from './id';

/** An instant on the wire: ISO 8601 with an offset or Z, because a wall time alone names no instant. */
export function IsInstant(): PropertyDecorator {
  return applyDecorators(
    ApiProperty({ type: String, format: 'date-time' }),
    MaxLength(40),
    IsISO8601(
      { strict: true, strictSeparator: true },
      { message: '$property is a date and time such as 2026-10-17T14:00:00Z' },
    ),
    Matches(/T\d{2}:\d{2}.*(Z|[+-]\d{2}:?\d{2})$/, {
      message: '$property needs its offset from UTC, such as Z or +01:00',
    }),
    // ISO 8601 allows more than the calendar of this machine: a leap second, hour 24, an offset of 30 hours.
    ValidateBy({
      name: 'isOnTheCalendar',
      validator: {
        validate: (value) => typeof value === 'string' && !Number.isNaN(Date.parse(value)),
        defaultMessage: () => '$property is not an instant of the calendar',
      },
    }),
  );
}

/** A calendar day, `2026-10-17`. */
export function IsDay(): PropertyDecorator {
  return applyDecorators(
    ApiProperty({ type: String, format: 'date' }),
    Matches(/^\d{4}-\d{2}-\d{2}$/, { message: '$property is a day such as 2026-10-17' }),
    IsISO8601({ strict: true }, { message: '$property is not a day of the calendar' }),
  );
}

/** Text somebody typed: trimmed, not empty, not endless, and without the NUL that PostgreSQL cannot store. */
export function IsWords(maxLength: number, minLength = 1): PropertyDecorator {
  return applyDecorators(
    Transform(({ value }: { value: unknown }) => (typeof value === 'string' ? value.trim() : value)),
    IsString(),
    MinLength(minLength),
    MaxLength(maxLength),
    Matches(/^[^\u0000]*$/, { message: '$property has a character that cannot be stored' }),
  );
}

/** A field that may be left out, though not sent as null: nothing behind the validation asks what null would mean. */
export function MayBeLeftOut(): PropertyDecorator {
  return ValidateIf((_body, value) => value !== undefined);
}

/** The id of something, in any spelling on the wire and in lower case behind it, as the database writes it. */
export function IsId(): PropertyDecorator {
  return applyDecorators(
    ApiProperty({ type: String, format: 'uuid' }),
    Transform(({ value }: { value: unknown }) => inLowerCase(value)),
    Matches(ID, { message: '$property is not an id' }),
  );
}

/** Each id once, in whatever spelling, and not endlessly many. */
export function AreIds(
  most: number,
  { tooMany, twice }: { tooMany?: string; twice?: string } = {},
): PropertyDecorator {
  return applyDecorators(
    ApiProperty({ type: [String], format: 'uuid', maxItems: most, uniqueItems: true }),
    Transform(({ value }: { value: unknown }) => (Array.isArray(value) ? value.map(inLowerCase) : value)),
    IsArray(),
    ArrayMaxSize(most, { message: tooMany }),
    ArrayUnique({ message: twice }),
    Matches(ID, { each: true, message: '$property holds something that is not an id' }),
  );
}

function inLowerCase(value: unknown): unknown {
  return typeof value === 'string' ? value.toLowerCase() : value;
}
