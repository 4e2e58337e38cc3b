import { keepDraft, readDraft } from '../../../lib/drafts';
import { useDraftOwner } from '../../../shared-ui/draft-owner';

const placeOf = (family: string): string => `level-bench:${family}`;

/** What this person last typed in a family, as the query of its address; '' when nothing was. */
export function useKeptSearch(family: string): string {
  const search = readDraft<string>(useDraftOwner(), placeOf(family))?.value;
  return search ? `?${search}` : '';
}

export function keepSearch(owner: string, family: string, search: string): void {
  keepDraft(owner, placeOf(family), search);
}
