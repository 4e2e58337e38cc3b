import { execFileSync } from 'node:child_process';
import { mkdtempSync, rmSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';

/**
 * Runs a netlist in Debian's ngspice and returns what it printed or measured, by name.
 *
 * @param circuit - one element a line, without title and end.
 * @param commands - the analysis, then what to print or measure.
 */
export function simulate(circuit: readonly string[], commands: readonly string[]): Record<string, number> {
  const folder = mkdtempSync(join(tmpdir(), 'levels-'));
  try {
    const file = join(folder, 'circuit.cir');
    writeFileSync(
      file,
      ['circuit', ...circuit, '.control', ...commands, 'quit', '.endc', '.end', ''].join('\n'),
    );
    const printed = execFileSync('ngspice', ['-b', file], {
      encoding: 'utf8',
      stdio: ['ignore', 'pipe', 'pipe'],
    });
    return resultsIn(printed);
  } finally {
    rmSync(folder, { recursive: true });
  }
}

function resultsIn(printed: string): Record<string, number> {
  const lines = printed.matchAll(/^(?<name>[a-z]\w*)\s*=\s*(?<value>[-+]?[\d.]+(?:e[-+]?\d+)?)/gim);
  const results: Record<string, number> = {};
  for (const { groups = {} } of lines) results[groups.name ?? ''] = Number(groups.value);
  return results;
}
