import { useMutation, useQueryClient } from '@tanstack/react-query';
import { api, unwrap } from '../../../api-client/client';
import type { components } from '../../../api-client/schema';
import type { OpenDay } from '../../../lib/opening-hours';

type RuleSet = components['schemas']['ChooseRulesDto']['ruleSet'];

export function useChooseRules() {
  const client = useQueryClient();
  return useMutation({
    mutationFn: (ruleSet: RuleSet) => unwrap(api.PUT('/api/club/rules', { body: { ruleSet } })),
    onSettled: () => client.invalidateQueries({ queryKey: ['club'] }),
  });
}

export function useSetOpeningHours() {
  const client = useQueryClient();
  return useMutation({
    mutationFn: (days: OpenDay[]) => unwrap(api.PUT('/api/club/opening-hours', { body: { days } })),
    onSettled: () => client.invalidateQueries({ queryKey: ['club'] }),
  });
}
