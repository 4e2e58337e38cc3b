import { IARU_REGION_1, US_97, type RuleSet } from '@ferrite-row/levels';

const RULE_SETS: Record<RuleSet['id'], RuleSet> = { 'IARU-R1': IARU_REGION_1, 'US-97': US_97 };

/** What stands in the field where the club's own set is not known. */
export const USUAL_RULE_SET: RuleSet['id'] = 'IARU-R1';

export const RULE_SET_CHOICES = Object.values(RULE_SETS).map(({ id, title }) => ({
  value: id,
  label: title,
}));

export const ruleSetOf = (id: RuleSet['id']): RuleSet => RULE_SETS[id];

/** Where a set comes from and of which day its text is. */
export const sourceOf = ({ title, source, textDate }: RuleSet): string =>
  `${title}. ${source}. Text of ${textDate}.`;
