import { type Environment, port } from '../common/environment';

export interface Settings {
  smtpPort: number;
  httpPort: number;
  stateFile?: string;
  /** A larger mail is refused. */
  largestBytes: number;
}

const TEN_MEGABYTES = 10 * 1024 * 1024;

export const readSettings = (environment: Environment): Settings => ({
  smtpPort: port(environment, 'SMTP_PORT'),
  httpPort: port(environment, 'HTTP_PORT'),
  stateFile: environment.FAKE_STATE_FILE || undefined,
  largestBytes: TEN_MEGABYTES,
});
