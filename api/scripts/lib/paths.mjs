import path from 'node:path';
import { fileURLToPath } from 'node:url';

/** The checkout: the folder that holds package.json, whatever folder the command was typed in. */
export const root = path.resolve(path.dirname(fileURLToPath(import.meta.url)), '../../..');

/**
 * @param {...string} parts path below the checkout
 * @returns {string}
 */
export const inRoot = (...parts) => path.join(root, ...parts);

/**
 * A path as a person wants to read it: short when it lies in the checkout.
 * @param {string} file
 */
export function shown(file) {
  const relative = path.relative(root, file);
  return relative.startsWith('..') ? file : relative;
}
