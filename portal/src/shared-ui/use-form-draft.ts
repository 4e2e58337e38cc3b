import { useEffect, useState } from 'react';
import type { DefaultValues, FieldValues, UseFormReturn } from 'react-hook-form';
import type { Draft } from '../lib/drafts';
import { dropDraft, keepDraft, readDraft } from '../lib/drafts';
import { useDraftOwner } from './draft-owner';
import { keptTime } from './use-draft';

interface FormDraft {
  /** 'Kept from 19:46' when an earlier draft filled the form. */
  keptFrom: string | undefined;
  /** '19:46' of the last keystroke kept. */
  keptAt: string | undefined;
  /** Forgets the draft; the form itself is left as it is. Call it when the form was sent. */
  drop: () => void;
}

/**
 * Keeps a whole react-hook-form on the device as it is typed, and brings it back.
 * Passwords and files do not belong in such a form.
 *
 * @example const form = useForm({ defaultValues }); const draft = useFormDraft(form, `booking:${day}`);
 */
export function useFormDraft<T extends FieldValues>(form: UseFormReturn<T>, place: string): FormDraft {
  const owner = useDraftOwner();
  const [found] = useState(() => readDraft<DefaultValues<T>>(owner, place));
  const [draft, setDraft] = useState<Draft<unknown> | undefined>(found);
  const { reset, subscribe, getValues } = form;

  useEffect(() => {
    if (found) reset({ ...getValues(), ...found.value }, { keepDefaultValues: true });
  }, [found, reset, getValues]);

  useEffect(
    () =>
      subscribe({
        formState: { values: true },
        callback: ({ values, name }) => {
          if (name) setDraft(keepDraft(owner, place, values));
        },
      }),
    [subscribe, owner, place],
  );

  return {
    keptFrom: found && draft ? `Kept from ${keptTime(found)}` : undefined,
    keptAt: keptTime(draft),
    drop: () => {
      dropDraft(owner, place);
      setDraft(undefined);
    },
  };
}
