import { useMutation, useQueryClient } from '@tanstack/react-query';
import { api, unwrap } from '../../../api-client/client';
import type { components } from '../../../api-client/schema';

type RuleSet = components['schemas']['ChooseRulesDto']['ruleSet'];

export function useChooseRules() {
  const client = useQueryClient();
  return useMutation({
    mutationFn: (ruleSet: RuleSet) => unwrap(api.PUT('/api/club/rules', { body: { ruleSet } })),
    onSettled: () => client.invalidateQueries({ queryKey: ['club'] }),
  });
}
