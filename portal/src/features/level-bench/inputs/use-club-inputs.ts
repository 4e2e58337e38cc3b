import { useMemo } from 'react';
import { useClub, type Club } from '../../../api-client/club';
import type { ChoiceInput } from './fields';

interface WithRules {
  ruleSet: ChoiceInput<Club['ruleSet']>;
}

/** The inputs of a page with the club's own rule set standing in its field until somebody chooses another. */
export function useClubInputs<F extends WithRules>(inputs: F): F {
  const ruleSet = useClub().data?.ruleSet;
  return useMemo(
    () => (ruleSet ? { ...inputs, ruleSet: { ...inputs.ruleSet, start: ruleSet } } : inputs),
    [inputs, ruleSet],
  );
}
