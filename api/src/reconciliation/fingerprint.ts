import { createHash } from 'node:crypto';
import type { FileLine } from './statement-csv.rules';

export interface MarkedLine extends FileLine {
  fingerprint: string;
  occurrence: number;
}

/**
 * Marks each line by what it says. The balance is part of it, so two payments alike on one day differ; lines alike even
 * in that are counted, the first being occurrence 1.
 */
export function marked(lines: readonly FileLine[]): MarkedLine[] {
  const seen = new Map<string, number>();
  return lines.map((line) => {
    const fingerprint = fingerprintOf(line);
    const occurrence = (seen.get(fingerprint) ?? 0) + 1;
    seen.set(fingerprint, occurrence);
    return { ...line, fingerprint, occurrence };
  });
}

function fingerprintOf({ day, description, amountMinor, balanceMinor }: FileLine): string {
  const said = [day, amountMinor, balanceMinor, description.toUpperCase()].join('|');
  return createHash('sha256').update(said).digest('hex');
}
