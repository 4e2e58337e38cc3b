import path from 'node:path';
import { root } from '../paths.mjs';
import { PlainError } from '../say.mjs';

/** @param {string} text @returns {number} */
function readPort(text) {
  const port = Number(text);
  if (Number.isInteger(port) && port > 0 && port < 65_536) return port;
  throw new PlainError(`PORT has to be a whole number from 1 to 65535, not '${text}'.`);
}

/**
 * What the person may set from outside, read once.
 * @param {NodeJS.ProcessEnv} env
 */
export function readSettings(env) {
  const port = readPort(env.PORT || '4780');
  const host = env.HOST || '127.0.0.1';
  return {
    port,
    host,
    /** Where this machine reaches it. */
    address: `http://${host === '0.0.0.0' || host === '::' ? '127.0.0.1' : host}:${port}`,
    publicUrl: env.PUBLIC_URL,
    dataFolder: path.resolve(root, env.FERRITE_DATA_DIR || '.ferrite'),
    isProduction: env.NODE_ENV === 'production',
    // With the real service named in the environment nothing stands in for it.
    databaseUrl: env.DATABASE_URL,
    hasCardService: Boolean(env.STRIPE_SECRET_KEY || env.STRIPE_API_BASE),
    hasMailService: Boolean(env.SMTP_URL),
  };
}

/** @typedef {ReturnType<typeof readSettings>} Settings */

const OURS =
  /^(PORT|HOST|NODE_ENV|DATABASE_|PUBLIC_URL|JWT_|STRIPE_|SMTP_|MAIL_|PORTAL_DIST|LOG_LEVEL|FERRITE_|FAKE_)/;

/**
 * The environment without anything that steers the product: a test run must not find its way to real keys.
 * @param {NodeJS.ProcessEnv} env
 * @returns {NodeJS.ProcessEnv}
 */
export function withoutOurs(env) {
  return Object.fromEntries(Object.entries(env).filter(([name]) => !OURS.test(name)));
}
