import { readFileSync } from 'node:fs';

/**
 * A process by more than its number: numbers are used again, the moment of starting is not.
 * @typedef {object} Identity
 * @property {number} pid
 * @property {string} startTicks when it started, in clock ticks since the machine did
 * @property {string} bootId which start of the machine
 */

/** @param {string} file */
function readOrNull(file) {
  try {
    return readFileSync(file, 'utf8');
  } catch {
    return null; // the process ended while we looked
  }
}

/**
 * State and start of a process from the text of /proc/<pid>/stat. The command's name stands in parentheses and may
 * itself hold spaces and parentheses, so fields are counted from the last one.
 * @param {string} stat
 */
export function parseStat(stat) {
  const fields = stat.slice(stat.lastIndexOf(')') + 2).split(' ');
  return { state: fields[0], startTicks: fields[19] };
}

/**
 * @param {number} pid
 * @returns {Identity | null} null when no such process runs; one that ended but was not yet collected counts as ended
 */
export function identityOf(pid) {
  const stat = readOrNull(`/proc/${pid}/stat`);
  const bootId = readOrNull('/proc/sys/kernel/random/boot_id');
  if (stat === null || bootId === null) return null;
  const { state, startTicks } = parseStat(stat);
  return 'ZX'.includes(state) ? null : { pid, startTicks, bootId: bootId.trim() };
}

/** @param {Identity} identity */
export function isAlive(identity) {
  const now = identityOf(identity.pid);
  return now !== null && now.startTicks === identity.startTicks && now.bootId === identity.bootId;
}

/**
 * @param {number} pid
 * @returns {string} the command line, words parted by spaces; empty when the process has ended
 */
export function commandLineOf(pid) {
  return (readOrNull(`/proc/${pid}/cmdline`) ?? '').replaceAll('\0', ' ').trim();
}
