import { Transform } from 'class-transformer';
import { IsBoolean, IsEmail, IsOptional, IsString, MaxLength, MinLength } from 'class-validator';

export class SignInDto {
  /** @example member@larkmoor.example */
  @Transform(({ value }: { value: unknown }) =>
    typeof value === 'string' ? value.trim().toLowerCase() : value,
  )
  @IsEmail({}, { message: 'That is not an email address' })
  @MaxLength(254)
  email: string;

  /** @example larkmoor-demo */
  @IsString()
  @MinLength(1, { message: 'Type your password' })
  @MaxLength(200)
  password: string;

  /** On a bench tablet the sign-in runs out after ten minutes untouched. */
  @IsOptional()
  @IsBoolean()
  sharedDevice?: boolean;
}
