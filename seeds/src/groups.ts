import { GroupsService } from '@ferrite-row/api/groups/groups.service';
import type { StageSet } from './stage-set';

const GROUPS = [
  {
    name: 'Thursday Twenty',
    about: 'Bench 3 and 4 on Thursdays',
    members: ['tamsin', 'marek', 'lena', 'bea', 'kofi'],
  },
  { name: 'Filter corner', about: 'Crystal filters, Saturday mornings', members: ['noor', 'jonty', 'priya'] },
  { name: 'First winter', about: 'New this autumn, Bench 6', members: ['tobias', 'rhoda', 'ansel', 'yusra'] },
];

export async function seedGroups({ context, as }: StageSet): Promise<number> {
  const groups = context.get(GroupsService);
  for (const { name, about, members } of GROUPS) {
    await groups.form({ name, about, memberIds: members.map((key) => as(key).personId) });
  }
  return GROUPS.length;
}
