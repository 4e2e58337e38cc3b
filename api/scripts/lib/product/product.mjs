import path from 'node:path';
import { untilHealthy } from '../processes/health.mjs';
import { inRoot } from '../paths.mjs';

/**
 * The programs of the product and how they find each other. `npm start`, `npm run dev` and the browser tests all start
 * them from here, so that the tests drive what people use.
 * @typedef {object} Place
 * @property {import('./settings.mjs').Settings} settings
 * @property {NodeJS.ProcessEnv} env what they inherit
 * @property {import('./secrets.mjs').Secrets} secrets
 * @property {string} databaseUrl
 * @property {string} folder for the fakes' memory
 * @property {string} logs
 * @property {{ cards: number, mail: number, smtp: number }} ports of the fakes
 */

/** @param {number} port */
const local = (port) => `http://127.0.0.1:${port}`;

/** @param {Place} place @returns {NodeJS.ProcessEnv} of the API, the seeds and the migrations */
export function apiEnvironment({ settings, env, secrets, databaseUrl, ports }) {
  return {
    ...env,
    NODE_ENV: env.NODE_ENV || 'development',
    HOST: settings.host,
    PORT: String(settings.port),
    PUBLIC_URL: settings.publicUrl ?? settings.address,
    DATABASE_URL: databaseUrl,
    JWT_SECRET: env.JWT_SECRET ?? secrets.signIn,
    FERRITE_DEMO: env.FERRITE_DEMO ?? (settings.isProduction ? '0' : '1'),
    ...(!settings.hasMailService && { SMTP_URL: `smtp://127.0.0.1:${ports.smtp}` }),
    ...(!settings.hasCardService && {
      STRIPE_API_BASE: local(ports.cards),
      STRIPE_SECRET_KEY: secrets.cards,
      STRIPE_WEBHOOK_SECRET: secrets.cardEvents,
    }),
  };
}

/**
 * @param {Place} place
 * @param {{ name: string, log: string, file: string, env: NodeJS.ProcessEnv }} program its file below the checkout
 * @returns {import('../processes/child.mjs').Spec}
 */
function nodeProgram({ logs }, { name, log, file, env }) {
  const mark = inRoot(file);
  return { name, command: process.execPath, args: [mark], env, log: path.join(logs, `${log}.log`), mark };
}

/** @param {Place} place */
function cardFake(place) {
  const { settings, env, secrets, ports, folder } = place;
  return nodeProgram(place, {
    name: 'The stand-in card service',
    log: 'cards',
    file: 'fakes/dist/payments/main.js',
    env: {
      ...env,
      PORT: String(ports.cards),
      FAKE_WEBHOOK_URL: `${settings.address}/api/webhooks/stripe`,
      FAKE_WEBHOOK_SECRET: secrets.cardEvents,
      FAKE_SECRET_KEY: secrets.cards,
      FAKE_STATE_FILE: path.join(folder, 'cards.json'),
    },
  });
}

/** @param {Place} place */
function mailFake(place) {
  const { env, ports, folder } = place;
  return nodeProgram(place, {
    name: 'The mail catcher',
    log: 'mail',
    file: 'fakes/dist/mail/main.js',
    env: {
      ...env,
      SMTP_PORT: String(ports.smtp),
      HTTP_PORT: String(ports.mail),
      FAKE_STATE_FILE: path.join(folder, 'mail.json'),
    },
  });
}

/** @param {Place} place @returns {{ mail: string | null, cards: string | null }} addresses of the fakes' own pages */
export function fakeAddresses({ settings, ports }) {
  return {
    mail: settings.hasMailService ? null : local(ports.mail),
    cards: settings.hasCardService ? null : local(ports.cards),
  };
}

/**
 * @param {Place} place
 * @param {import('../processes/children.mjs').Children} children
 * @param {AbortSignal} signal
 */
export async function startFakes(place, children, signal) {
  const { mail, cards } = fakeAddresses(place);
  /** @param {string | null} address @param {import('../processes/child.mjs').Spec} spec */
  const start = (address, spec) => address && untilHealthy(children.start(spec), `${address}/health`, signal);
  await Promise.all([start(cards, cardFake(place)), start(mail, mailFake(place))]);
}

/**
 * Brings the schema up to date and, on anything but a production start, fills an empty database with the demo club.
 * @param {Place} place
 * @param {import('../processes/children.mjs').Children} children
 * @param {AbortSignal} signal
 */
export async function fillDatabase(place, children, signal) {
  const env = apiEnvironment(place);
  await children.mustRun(
    nodeProgram(place, { name: 'The migration', log: 'migrate', file: 'api/dist/migrate.js', env }),
    signal,
  );
  if (place.settings.isProduction) return;
  await children.mustRun(
    nodeProgram(place, { name: 'Seeding the demo club', log: 'seeds', file: 'seeds/dist/main.js', env }),
    signal,
  );
}

/**
 * @param {Place} place
 * @param {import('../processes/children.mjs').Children} children
 * @param {AbortSignal} signal
 */
export async function startApi(place, children, signal) {
  const env = apiEnvironment(place);
  const child = children.start(
    nodeProgram(place, { name: 'The API', log: 'api', file: 'api/dist/main.js', env }),
  );
  await untilHealthy(child, `${place.settings.address}/api/health`, signal);
  return child;
}
