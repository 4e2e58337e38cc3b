import { plainToInstance, Type } from 'class-transformer';
import {
  IsIn,
  IsInt,
  IsOptional,
  IsString,
  IsUrl,
  Matches,
  Max,
  Min,
  MinLength,
  validateSync,
} from 'class-validator';

/** Everything the process takes from its environment, read once at start-up and typed. */
export class Environment {
  @IsIn(['development', 'production', 'test'])
  NODE_ENV: 'development' | 'production' | 'test' = 'development';

  @IsString()
  HOST = '127.0.0.1';

  @Type(() => Number)
  @IsInt()
  @Min(0)
  @Max(65_535)
  PORT = 4780;

  @IsString()
  @MinLength(1)
  DATABASE_URL: string;

  /** Connections this process may hold; several processes share one server. */
  @Type(() => Number)
  @IsInt()
  @Min(2)
  @Max(200)
  DATABASE_POOL = 10;

  /** How many seconds a request waits for a free connection before it is told to come again. */
  @Type(() => Number)
  @IsInt()
  @Min(1)
  @Max(120)
  DATABASE_WAIT = 20;

  /** The address people type; links in mail and the return from the card page are made from it. */
  @IsUrl({ require_tld: false, require_protocol: true })
  PUBLIC_URL = 'http://127.0.0.1:4780';

  /**
   * Whose word about the caller's address is taken: `loopback`, or a proxy's addresses with commas between them. Left
   * out, nobody's, because without a proxy in front everybody could name an address of their choosing.
   */
  @IsOptional()
  @Matches(/^[\da-z:./]*[:.a-z][\da-z:./]*(, *[\da-z:./]*[:.a-z][\da-z:./]*)*$/i, {
    message: 'TRUSTED_PROXY is loopback or addresses with commas between them',
  })
  TRUSTED_PROXY?: string;

  @IsString()
  @MinLength(32)
  JWT_SECRET: string;

  @IsString()
  @MinLength(8)
  STRIPE_SECRET_KEY: string;

  @IsString()
  @MinLength(8)
  STRIPE_WEBHOOK_SECRET: string;

  /** Left out, the SDK talks to the real service. */
  @IsOptional()
  @IsUrl({ require_tld: false, require_protocol: true })
  STRIPE_API_BASE?: string;

  @IsUrl({ require_tld: false, require_protocol: true, protocols: ['smtp', 'smtps'] })
  SMTP_URL: string;

  @IsString()
  MAIL_FROM = 'Ferrite Row <portal@ferrite-row.example>';

  @IsOptional()
  @IsString()
  PORTAL_DIST?: string;

  @IsIn(['fatal', 'error', 'warn', 'info', 'debug', 'silent'])
  LOG_LEVEL: 'fatal' | 'error' | 'warn' | 'info' | 'debug' | 'silent' = 'info';

  /** 'off' where nothing may happen by itself: in tests and while seeding. */
  @IsIn(['on', 'off'])
  FERRITE_JOBS: 'on' | 'off' = 'on';

  /** '1' on the demo club only: the sign-in page then lists its accounts. */
  @IsIn(['0', '1'])
  FERRITE_DEMO: '0' | '1' = '0';
}

/** @throws Error that names every missing or malformed variable, so that the process stops at once. */
export function readEnvironment(raw: Record<string, unknown>): Environment {
  const environment = plainToInstance(Environment, raw, { exposeDefaultValues: true });
  const errors = validateSync(environment, { skipMissingProperties: false });
  if (errors.length > 0) {
    const lines = errors.map(
      (error) => `  ${error.property}: ${Object.values(error.constraints ?? {}).join(', ')}`,
    );
    throw new Error(`The environment is not complete:\n${lines.join('\n')}`);
  }
  if (environment.NODE_ENV === 'production' && environment.FERRITE_DEMO === '1') {
    throw new Error('FERRITE_DEMO=1 is refused in production: it would publish the demo accounts.');
  }
  return environment;
}
