import { figuresFor, figureWords } from '@ferrite-row/levels';
import { damageWords } from '../../../lib/text';
import type { BuildCheck, InstrumentChoice } from '../api/builds';
import { entryMethod, fieldsOf } from './live-reading';

/** 'From FR-021: vertical gain ± 3 %; never above +30 dBm.'; what stands in a field of its own is said there. */
export function sheetWords(
  { tag, figures, damageLevelDbm }: Pick<InstrumentChoice, 'tag' | 'figures' | 'damageLevelDbm'>,
  check: Pick<BuildCheck, 'method' | 'unit'>,
): string | undefined {
  const method = entryMethod(check);
  if (!method) return undefined;
  const own = fieldsOf(check).map(({ name }) => name);
  const limits = figureWords(figuresFor(method, check.unit ?? '', figures))
    .filter(({ name }) => !own.includes(name))
    .map(({ label, words }) => `${label.toLowerCase()} ${words}`);
  const harm = damageLevelDbm === null ? [] : [`never above ${damageWords(damageLevelDbm)} at its input`];
  const said = [...limits, ...harm];
  return said.length === 0 ? undefined : `From ${tag}: ${said.join(', ')}.`;
}
