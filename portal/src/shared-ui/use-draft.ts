import { useState } from 'react';
import { formatTime } from '../lib/club-time-text';
import type { Draft } from '../lib/drafts';
import { dropDraft, keepDraft, readDraft } from '../lib/drafts';
import { useDraftOwner } from './draft-owner';

interface DraftState<T> {
  value: T;
  /** Writes to the device at once. */
  setValue: (value: T) => void;
  /** 'Kept from 19:46' when something typed earlier came back, else undefined. */
  keptFrom: string | undefined;
  /** Time of the last keystroke kept, '19:46', for "Draft kept 19:46". */
  keptAt: string | undefined;
  /** Forgets it: after it was sent, or when the person throws it away. */
  drop: () => void;
}

/** '19:46', from a draft's instant. */
export const keptTime = (draft: Draft<unknown> | undefined): string | undefined =>
  draft && formatTime(draft.keptAt);

/**
 * What a person types in one place, kept on this device until it is sent.
 *
 * @param place - names build and check, or whatever the place is: `reading:${buildId}:${checkId}`.
 * @param initial - what the field holds when nothing was kept.
 */
export function useDraft<T>(place: string, initial: T): DraftState<T> {
  const owner = useDraftOwner();
  const [found] = useState(() => readDraft<T>(owner, place));
  const [draft, setDraft] = useState<Draft<T> | undefined>(found);
  const [value, setLocal] = useState<T>(found ? found.value : initial);
  const time = keptTime(found);
  return {
    value,
    setValue: (next) => {
      setLocal(next);
      setDraft(keepDraft(owner, place, next));
    },
    keptFrom: found && draft ? `Kept from ${time}` : undefined,
    keptAt: keptTime(draft),
    drop: () => {
      dropDraft(owner, place);
      setDraft(undefined);
      setLocal(initial);
    },
  };
}
