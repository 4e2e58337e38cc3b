import { requireOneOf, requireWithin } from '../domain';
import { OutOfDomainError } from '../errors';
import type { Dated, EmissionKind, RuleSet, Span } from '../rule-sets/rule-set';
import { hertz } from '../units';
import type { OccupiedBand } from './occupied';
import type { PowerInput } from './radiated-power';

/** An emission to be checked. */
export interface EmissionInput extends OccupiedBand, PowerInput {
  ruleSet: RuleSet;
  /** One of the set's; left out where the set knows none. */
  licenceClass?: string;
  emission: EmissionKind;
  /** Day of the emission, ISO 8601: `2026-02-13`. */
  day: string;
  /** Region of the ITU the station is in; the set's own, or 2, where left out. */
  region?: number;
}

const DAY = /^\d{4}-\d{2}-\d{2}$/;

/** An emission in the units of the sets, with every choice made. */
export interface Asked extends EmissionInput {
  span: Span;
  region: number;
}

/** Checks what is asked and makes every choice left out. */
export function requireAsked(input: EmissionInput): Asked {
  const { ruleSet, licenceClass, emission, day } = input;
  const low = hertz(input.lowHertz, 'lowHertz');
  const top = { input: 'highHertz', label: 'Upper end', unit: 'Hz', above: low, atMost: 1e12 };
  requireWithin(top, input.highHertz);
  const kinds = ['CW', 'phone', 'image', 'RTTY', 'data', 'MCW', 'test'] as const;
  requireOneOf({ input: 'emission', label: 'Kind of emission' }, kinds, emission);
  if (ruleSet.licenceClasses.length > 0) {
    requireOneOf(
      { input: 'licenceClass', label: 'Licence class' },
      ruleSet.licenceClasses,
      licenceClass ?? '',
    );
  }
  const usual = ruleSet.regions.includes(2) ? 2 : (ruleSet.regions[0] ?? 1);
  const region = requireOneOf(
    { input: 'region', label: 'Region of the ITU' },
    ruleSet.regions,
    input.region ?? usual,
  );
  if (!DAY.test(day) || day < ruleSet.coversFrom) throw wrongDay(day, ruleSet);
  return { ...input, region, span: [low / 1000, input.highHertz / 1000] };
}

function wrongDay(day: string, ruleSet: RuleSet): OutOfDomainError {
  const permitted = `a day as 2026-02-13, from ${ruleSet.coversFrom} on`;
  return new OutOfDomainError('day', day, permitted, `Day: needed is ${permitted}.`);
}

/** Whether a row holds for what is asked. */
export function applies(
  row: Dated & { classes?: readonly string[]; regions?: readonly number[] },
  { day, licenceClass = '', region }: Asked,
): boolean {
  return (
    (row.since === undefined || day >= row.since) &&
    (row.until === undefined || day < row.until) &&
    (row.classes === undefined || row.classes.includes(licenceClass)) &&
    (row.regions === undefined || row.regions.includes(region))
  );
}
