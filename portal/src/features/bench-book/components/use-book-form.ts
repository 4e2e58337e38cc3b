import { useEffect, useRef, useState } from 'react';
import { useForm } from 'react-hook-form';
import { clockText } from '../../../lib/club-time-text';
import { useFormDraft } from '../../../shared-ui/use-form-draft';
import type { Bench, Instrument } from '../api/bench-book';
import type { BookView } from '../book-view';
import { startingValues, type BookingValues } from '../form/booking-values';
import type { Picked } from './lane-day';

/**
 * The form's values for the whole page, because the lanes draw what is typed and a click in the lanes types for you.
 * They are kept on the device; what a check needs is filled in once.
 */
export function useBookForm(view: BookView, benches: readonly Bench[], instruments: readonly Instrument[]) {
  const form = useForm<BookingValues>({ defaultValues: startingValues() });
  const draft = useFormDraft(form, 'booking');
  const [isOpen, setIsOpen] = useState(view.check !== '' || view.need !== '');
  const hasFilled = useRef(false);
  const { setValue, getValues, reset } = form;

  useEffect(() => {
    if (hasFilled.current || benches.length === 0 || instruments.length === 0) return;
    hasFilled.current = true;
    const values = getValues();
    const needed = view.need ? neededOf(instruments, view.need) : undefined;
    const isUntouched = values.benchId === '' && values.instrumentIds.length === 0;
    // By reset and not by setValue: what the page fills in is no draft of the person's.
    reset(
      {
        ...values,
        ...(isUntouched && { benchId: benches[0]?.id ?? '' }),
        ...(view.check && { checkId: view.check }),
        ...(needed && { instrumentIds: [needed.id] }),
      },
      { keepDefaultValues: true },
    );
  }, [benches, instruments, view.check, view.need, reset, getValues]);

  /** A stretch picked in the lanes: its lane joins what is chosen, a bench in place of the one before. */
  const pick = ({ date, lane, from, to }: Picked) => {
    setValue('day', date);
    setValue('from', clockText(from));
    setValue('to', clockText(to));
    const chosen = getValues('instrumentIds');
    if (lane.kind === 'bench') setValue('benchId', lane.id);
    else if (lane.instrument.mayBook && !chosen.includes(lane.id))
      setValue('instrumentIds', [...chosen, lane.id]);
    setIsOpen(true);
  };
  const finish = () => {
    draft.drop();
    const { benchId } = getValues();
    reset({ ...startingValues(), benchId });
    view.dropNeed();
    setIsOpen(false);
  };
  return {
    form,
    isOpen,
    keptFrom: draft.keptFrom,
    pick,
    finish,
    open: () => setIsOpen(true),
    close: () => setIsOpen(false),
  };
}

/** The first instrument of the kind that the person may use, else the first of the kind, whose row says why not. */
function neededOf(instruments: readonly Instrument[], need: string): Instrument | undefined {
  const ofKind = instruments.filter(({ kind }) => kind.id === need || kind.name === need);
  return ofKind.find(({ mayBook }) => mayBook) ?? ofKind[0];
}
