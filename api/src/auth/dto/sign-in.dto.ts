import { Transform } from 'class-transformer';
import { IsBoolean, IsEmail, IsString, MaxLength, MinLength } from 'class-validator';
import { MayBeLeftOut } from '../../common/validators';

export class SignInDto {
  /** @example member@larkmoor.example */
  @Transform(({ value }: { value: unknown }) =>
    typeof value === 'string' ? value.trim().toLowerCase() : value,
  )
  @MaxLength(254)
  @IsEmail({}, { message: 'That is not an email address' })
  email: string;

  /** @example larkmoor-demo */
  @MinLength(1, { message: 'Type your password' })
  @MaxLength(200)
  @IsString()
  password: string;

  /** On a bench tablet the sign-in runs out after ten minutes untouched. */
  @MayBeLeftOut()
  @IsBoolean()
  sharedDevice?: boolean;
}
