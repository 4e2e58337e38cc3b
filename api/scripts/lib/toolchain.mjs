// Imported first by every command. The check runs on import, before the modules that need a current Node are evaluated,
// so that an old Node gets this sentence and not a stack trace.
import { readFileSync } from 'node:fs';
import process from 'node:process';

const { engines } = JSON.parse(readFileSync(new URL('../../../package.json', import.meta.url), 'utf8'));
const [needMajor, needMinor] = engines.node.match(/\d+/g).map(Number);
const [major, minor] = process.versions.node.split('.').map(Number);

if (major < needMajor || (major === needMajor && minor < needMinor)) {
  console.error(`Ferrite Row needs Node ${engines.node}; this is Node ${process.versions.node}.`);
  process.exit(1);
}
if (process.platform !== 'linux') {
  console.error('These commands run on Debian Linux: they keep track of their processes through /proc.');
  process.exit(1);
}
