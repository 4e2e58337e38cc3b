import { useState } from 'react';
import { carryOut } from '../../api-client/carry-out';
import { formatMoney } from '../../lib/money';
import { useToast } from '../../shared-ui/toasts';
import { useDraft } from '../../shared-ui/use-draft';
import { useMatchLine, useTakeBackMatch, type BookItem, type StatementDetail } from './api/treasury';
import { faultOf, matchBody, nextUnmatched, type Choice } from './settling';

interface Kept {
  itemIds: string[];
  accountCode: string;
  note: string;
}

const NOTHING: Kept = { itemIds: [], accountCode: '', note: '' };

/** Which line is open, what is chosen for it, and the three things that can be done. The choice survives a reload. */
export function useSettling(detail: StatementDetail) {
  const { id: statementId, lines, books, currency } = detail;
  const [opened, setOpened] = useState(() => nextUnmatched(lines, undefined) ?? lines[0]?.id);
  const line = lines.find(({ id }) => id === opened);
  const draft = useDraft<Record<string, Kept>>(`reconcile:${statementId}`, {});
  const kept = draft.value[line?.id ?? ''] ?? NOTHING;
  const matching = useMatchLine();
  const takingBack = useTakeBackMatch();
  const say = useToast();
  // What was chosen may have been settled elsewhere meanwhile.
  const items = kept.itemIds.flatMap(
    (id) => books.find((item) => item.lineId === null && item.id === id) ?? [],
  );
  const choice: Choice = { items, accountCode: kept.accountCode, note: kept.note };

  const keep = (changes: Partial<Kept>) => {
    if (line) draft.setValue({ ...draft.value, [line.id]: { ...kept, ...changes } });
  };
  const open = (lineId: string) => {
    matching.reset();
    takingBack.reset();
    setOpened(lineId);
  };
  const next = () => {
    const following = nextUnmatched(lines, line?.id);
    if (following) open(following);
  };
  const takeBack = () => {
    if (line?.state !== 'matched') return;
    carryOut(takingBack, line.id, {
      onSuccess: () => say(`Match of ${formatMoney(line.amountMinor, currency)} taken back.`),
    });
  };
  const accept = () => {
    if (!line || line.state === 'matched' || faultOf(line, choice) || matching.isPending) return;
    carryOut(
      matching,
      { lineId: line.id, choice: matchBody(choice) },
      {
        onSuccess: () => {
          const { [line.id]: _settled, ...rest } = draft.value;
          draft.setValue(rest);
          say(`${formatMoney(line.amountMinor, currency)} matched.`, () => takingBack.mutate(line.id));
          next();
        },
      },
    );
  };
  const toggle = ({ id }: BookItem) =>
    keep({
      itemIds: kept.itemIds.includes(id) ? kept.itemIds.filter((one) => one !== id) : [...kept.itemIds, id],
    });
  return {
    line,
    choice,
    open,
    next,
    accept,
    takeBack,
    toggle,
    setChoice: ({ accountCode, note }: Partial<Choice>) =>
      keep({ ...(accountCode !== undefined && { accountCode }), ...(note !== undefined && { note }) }),
    isBusy: matching.isPending || takingBack.isPending,
    error: matching.error ?? takingBack.error,
  };
}
