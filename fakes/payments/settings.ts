import { type Environment, port, required, wholeNumber } from '../common/environment';
import type { FeeRule } from './fees';

export interface Settings {
  port: number;
  secretKey: string;
  webhookSecret: string;
  /** Where events are posted; without one they wait. */
  webhookUrl?: string;
  stateFile?: string;
  fee: FeeRule;
  /** How long a payment with a slow card stays unconfirmed. */
  lateMs: number;
  /** Wait before the second attempt at a webhook; it doubles after that. */
  retryFirstMs: number;
}

/** The default fee, 1.5 % + 20 minor units, is an invented tariff of a usual form (common practice). */
export function readSettings(environment: Environment): Settings {
  return {
    port: port(environment, 'PORT'),
    secretKey: required(environment, 'FAKE_SECRET_KEY'),
    webhookSecret: required(environment, 'FAKE_WEBHOOK_SECRET'),
    webhookUrl: environment.FAKE_WEBHOOK_URL || undefined,
    stateFile: environment.FAKE_STATE_FILE || undefined,
    fee: {
      basisPoints: wholeNumber(environment, 'FAKE_FEE_BASIS_POINTS', 150),
      fixedMinor: wholeNumber(environment, 'FAKE_FEE_FIXED_MINOR', 20),
    },
    lateMs: wholeNumber(environment, 'FAKE_LATE_MS', 6000),
    retryFirstMs: wholeNumber(environment, 'FAKE_RETRY_FIRST_MS', 500),
  };
}
