import { useQuery } from '@tanstack/react-query';
import { useEffect, useState } from 'react';
import { useWatch, type Control } from 'react-hook-form';
import { ProblemError } from '../../../api-client/problem-error';
import type { CheckedNight, NightTimes } from '../api/nights';
import { previewQuery } from '../api/nights';
import { FIELD_OF, timesOf, type PlanForm } from '../plan-form';

const STILL_MS = 250;
/** One and the same, so that nothing downstream takes it for news. */
const NO_NIGHTS: readonly CheckedNight[] = [];

export interface PlanPreview {
  nights: readonly CheckedNight[];
  toTell: number;
  /** Day, times and number of nights can be read. */
  isReadable: boolean;
  /** Not of what is typed now, or not known yet. */
  isStale: boolean;
  /** Words for the fields the API finds fault with. */
  errors: Partial<Record<keyof PlanForm, string>>;
  /** A failure that is no field's. */
  failure: unknown;
  retry: () => void;
}

/** Each date of the plan with its verdict, looked up when the typing rests for a moment. */
export function usePlanPreview(control: Control<PlanForm>): PlanPreview {
  const form = useWatch({ control }) as PlanForm;
  const typed = timesOf(form);
  const resting = useResting(typed);
  const query = useQuery(previewQuery(resting));
  const errors = query.isError ? fieldErrors(query.error) : {};
  const isReadable = typed !== undefined && !query.isError;
  return {
    nights: isReadable ? (query.data?.nights ?? NO_NIGHTS) : NO_NIGHTS,
    isReadable,
    toTell: query.data?.toTell ?? 0,
    isStale: query.isPlaceholderData || JSON.stringify(typed) !== JSON.stringify(resting) || !query.data,
    errors,
    failure: query.isError && Object.keys(errors).length === 0 ? query.error : undefined,
    retry: () => void query.refetch(),
  };
}

/** The value as it was when it last rested. */
function useResting(value: NightTimes | undefined): NightTimes | undefined {
  const text = JSON.stringify(value ?? null);
  const [rested, setRested] = useState(text);
  useEffect(() => {
    const timer = setTimeout(() => setRested(text), STILL_MS);
    return () => clearTimeout(timer);
  }, [text]);
  return (JSON.parse(rested) as NightTimes | null) ?? undefined;
}

function fieldErrors(error: unknown): PlanPreview['errors'] {
  if (!(error instanceof ProblemError)) return {};
  const named = error.errors.flatMap(({ pointer, detail }) => {
    const field = FIELD_OF[pointer];
    return field ? [[field, detail] as const] : [];
  });
  return Object.fromEntries(named);
}
