import { appendFileSync } from 'node:fs';
import { createInterface } from 'node:readline';
import { say } from '../say.mjs';

/**
 * Shows each line a process prints, with a word before it that says whose it is, and keeps it in its log.
 * @param {import('node:child_process').ChildProcess} source
 * @param {string} word
 * @param {string} log
 */
export function echoLines(source, word, log) {
  for (const stream of [source.stdout, source.stderr]) {
    if (!stream) continue;
    createInterface({ input: stream }).on('line', (line) => {
      appendFileSync(log, `${line}\n`);
      say(`${word.padEnd(7)}| ${line}`);
    });
  }
}
