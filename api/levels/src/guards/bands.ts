import type { RuleSet } from '../rule-sets/rule-set';
import { merged } from './spans';

/** A band as a whole, whatever the class. */
export interface AmateurBand {
  band: string;
  lowHertz: number;
  highHertz: number;
}

/**
 * The bands of a rule set, for an axis or a list: each as far as any class may go in any region of the set.
 *
 * @param day - ISO 8601; rows that do not hold on it are left out.
 * @param region - of the ITU; all of the set's where left out.
 * @returns by rising frequency; channels outside the bands are not among them.
 * @example bandsOf(IARU_REGION_1, '2026-12-01')[3] //=> { band: '40 m', lowHertz: 7000000, highHertz: 7200000 }
 * @see the rule set's own source
 */
export function bandsOf(ruleSet: RuleSet, day: string, region?: number): AmateurBand[] {
  const holds = ruleSet.bands.filter(
    ({ since = '', until = '9999', regions }) =>
      day >= since &&
      day < until &&
      (region === undefined || regions === undefined || regions.includes(region)),
  );
  const names = [...new Set(holds.map(({ band }) => band))];
  return names
    .flatMap((band) => {
      const spans = merged(holds.filter((row) => row.band === band).flatMap((row) => row.spans));
      return spans.map(([low, high]) => ({ band, lowHertz: low * 1000, highHertz: high * 1000 }));
    })
    .sort((a, b) => a.lowHertz - b.lowHertz);
}
