import { useEffect, useEffectEvent, useRef, useState } from 'react';
import { useForm, useWatch, type UseFormReturn } from 'react-hook-form';
import { addDays, clubDay } from '../../../lib/club-time';
import { clockText } from '../../../lib/club-time-text';
import { useFormDraft } from '../../../shared-ui/use-form-draft';
import type { Bench, Instrument } from '../api/bench-book';
import type { BookView } from '../book-view';
import { useOpeningHours } from '../../../api-client/club';
import { DAY, startingTimes, startingValues, type BookingValues } from '../form/booking-values';
import type { Picked } from './lane-day';

/** As far ahead as the book is open. */
const FURTHEST_DAYS = 180;

const isInBook = (day: string, today: string): boolean =>
  DAY.test(day) && day >= today && day <= addDays(today, FURTHEST_DAYS);

/** The lanes show the day that is typed; half a year, a day gone by and one past the book's end are not followed. */
function useLanesFollow(view: BookView, form: UseFormReturn<BookingValues>, isOpen: boolean): void {
  const day = useWatch({ control: form.control, name: 'day' });
  const follow = useEffectEvent(() => {
    if (isOpen && day !== view.day && isInBook(day, clubDay())) view.showDay(day);
  });
  useEffect(() => follow(), [day, isOpen]);
}

/**
 * The form's values for the whole page, because the lanes draw what is typed and a click in the lanes types for you.
 * They are kept on the device; what a check needs is filled in once.
 */
export function useBookForm(view: BookView, benches: readonly Bench[], instruments: readonly Instrument[]) {
  const hours = useOpeningHours();
  const form = useForm<BookingValues>({ defaultValues: startingValues(hours) });
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
        ...(isUntouched && { benchId: shownBench(benches, view.tags) }),
        ...(view.check && { checkId: view.check }),
        ...(needed && { instrumentIds: [needed.id] }),
      },
      { keepDefaultValues: true },
    );
  }, [benches, instruments, view.check, view.need, view.tags, reset, getValues]);

  useLanesFollow(view, form, isOpen);
  /** Opens with the bench and the day that are looked at, unless something was typed before. */
  const open = () => {
    const isToCome = view.day > clubDay();
    if (!isOpen && draft.keptAt === undefined)
      reset(
        {
          ...getValues(),
          benchId: shownBench(benches, view.tags),
          ...(isToCome && startingTimes(hours, view.day)),
        },
        { keepDefaultValues: true },
      );
    setIsOpen(true);
  };
  const showDay = (day: string) => {
    view.showDay(day);
    if (isOpen) setValue('day', day);
  };
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
    reset({ ...startingValues(hours), benchId });
    view.dropNeed();
    setIsOpen(false);
  };
  return {
    form,
    isOpen,
    keptFrom: draft.keptFrom,
    pick,
    finish,
    open,
    showDay,
    close: () => setIsOpen(false),
  };
}

/** The first bench in the lanes, else the first there is. */
const shownBench = (benches: readonly Bench[], tags: readonly string[]): string =>
  (benches.find(({ tag }) => tags.includes(tag)) ?? benches[0])?.id ?? '';

/** The first instrument of the kind that the person may use, else the first of the kind, whose row says why not. */
function neededOf(instruments: readonly Instrument[], need: string): Instrument | undefined {
  const ofKind = instruments.filter(({ kind }) => kind.id === need || kind.name === need);
  return ofKind.find(({ mayBook }) => mayBook) ?? ofKind[0];
}
