import { Transform } from 'class-transformer';
import { ArrayMaxSize, ArrayMinSize, ArrayUnique, IsArray, IsOptional, IsUUID } from 'class-validator';
import { IsInstant } from '../../common/validators';

const MOST_RESOURCES = 8;

export class CreateBookingDto {
  /** Benches and instruments, 1 to 8: all of them are booked, or none. */
  @Transform(({ value }: { value: unknown }) => (Array.isArray(value) ? value.map(lowerCased) : value))
  @IsArray()
  @ArrayMinSize(1, { message: 'Choose at least one bench or instrument' })
  @ArrayMaxSize(MOST_RESOURCES, { message: 'One booking holds at most 8 benches and instruments' })
  @IsUUID(undefined, { each: true })
  @ArrayUnique({ message: 'One bench or instrument stands in the list twice' })
  resourceIds: string[];

  @IsInstant()
  startsAt: string;

  @IsInstant()
  endsAt: string;

  /** Book it for one of your groups. */
  @IsOptional()
  @IsUUID()
  groupId?: string;

  /** The check of the plan you will work on. */
  @IsOptional()
  @IsUUID()
  checkId?: string;
}

/** Two spellings of one id are one id, here and in the database. */
function lowerCased(value: unknown): unknown {
  return typeof value === 'string' ? value.toLowerCase() : value;
}
