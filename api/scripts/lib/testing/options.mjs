import { parseArgs } from 'node:util';
import { PlainError } from '../say.mjs';

/** @typedef {import('./step.mjs').Step} Step */

/** @param {Step[]} steps */
export function help(steps) {
  const list = steps.map(({ name, about }) => `  ${name.padEnd(12)}${about}`);
  return [
    'npm test                          everything',
    'npm test -- --only jest,vitest    these steps, and what they need',
    '',
    'Steps:',
    ...list,
    '',
    'The last line sums what the runners counted; a step that was not reached counts as failed.',
  ].join('\n');
}

/**
 * The steps asked for, with those they need, in the usual order.
 * @param {Step[]} steps
 * @param {string[]} names
 */
function choose(steps, names) {
  const unknown = names.filter((name) => !steps.some((step) => step.name === name));
  if (unknown.length > 0) {
    throw new PlainError(`There is no step named ${unknown.join(', ')}.\n\n${help(steps)}`);
  }
  const chosen = new Set(names);
  // Steps stand after those they need, so one walk from the end finds all of these.
  for (const { name, needs } of [...steps].reverse()) {
    if (chosen.has(name)) needs?.forEach((needed) => chosen.add(needed));
  }
  return steps.filter(({ name }) => chosen.has(name));
}

/**
 * @param {string[]} args
 * @param {Step[]} steps
 * @returns {Step[] | null} the steps to take; null when only help is asked for
 */
export function readOptions(args, steps) {
  const options = /** @type {const} */ ({ only: { type: 'string' }, help: { type: 'boolean', short: 'h' } });
  try {
    const { values } = parseArgs({ args, options });
    if (values.help) return null;
    return values.only === undefined ? steps : choose(steps, values.only.split(','));
  } catch (error) {
    if (error instanceof PlainError) throw error;
    throw new PlainError(`${/** @type {Error} */ (error).message}\n\n${help(steps)}`);
  }
}
