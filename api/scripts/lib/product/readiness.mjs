import { shown } from '../paths.mjs';

/** The demo club's accounts that a visitor starts from; the seeds make them. */
const demoAccounts = [
  ['organiser@larkmoor.example', 'organiser, mentor'],
  ['mentor@larkmoor.example', 'mentor'],
  ['steward@larkmoor.example', 'steward'],
  ['treasurer@larkmoor.example', 'treasurer'],
  ['member@larkmoor.example', 'member'],
  ['member2@larkmoor.example', 'member'],
];

const DEMO_PASSWORD = 'larkmoor-demo';

/** @param {[string, string | null][]} rows */
const table = (rows) =>
  rows.flatMap(([left, right]) => (right === null ? [] : `  ${left.padEnd(30)}${right}`));

/**
 * What stands in the terminal once everything answers.
 * @param {object} what
 * @param {string} what.address
 * @param {boolean} what.isDemo
 * @param {string | null} what.mail
 * @param {string | null} what.cards
 * @param {string} what.logs
 * @returns {string}
 */
export function readiness({ address, isDemo, mail, cards, logs }) {
  const accounts = isDemo
    ? [
        '',
        `Demo accounts, password ${DEMO_PASSWORD}:`,
        ...table(/** @type {[string, string][]} */ (demoAccounts)),
      ]
    : [];
  const places = table([
    ['Mail the portal has sent', mail],
    ['Stand-in card service', cards],
    ['Logs', shown(logs)],
  ]);
  return [
    `Ferrite Row is ready at ${address}`,
    ...accounts,
    '',
    ...places,
    '',
    'Ctrl-C stops everything.',
  ].join('\n');
}
