import Box from '@mui/material/Box';
import { useQuery } from '@tanstack/react-query';
import { useWatch, type Control, type UseFormReturn } from 'react-hook-form';
import { myBuildsQuery } from '../../../api-client/my-builds';
import { lengthText } from '../../../lib/club-time-text';
import { FormSelect, FormText } from '../../../shared-ui/form/form-fields';
import { ProblemAlert } from '../../../shared-ui/problem-alert';
import { usePhone } from '../../../shared-ui/use-phone';
import {
  bookingsQuery,
  instrumentsQuery,
  myGroupsQuery,
  type Bench,
  type Booking,
  type FreeTime,
} from '../api/bench-book';
import { openChecks } from '../api/my-build';
import {
  clockProblem,
  endProblem,
  readTimes,
  skippedProblem,
  type BookingValues,
} from '../form/booking-values';
import { holderOf, holderWords } from '../form/instrument-words';
import type { Refusal } from '../form/refusal';
import { InstrumentRows } from './instrument-rows';
import { RefusalBanner } from './refusal-banner';

interface BookFormProps {
  form: UseFormReturn<BookingValues>;
  benches: readonly Bench[];
  laneIds: readonly string[];
  askedCheckId: string;
  refusal: Refusal | undefined;
  failure: unknown;
  isBusy: boolean;
  onTake: (time: FreeTime) => void;
  onRetry: () => void;
}

const PAIR = { display: 'grid', gridTemplateColumns: '1fr 1fr', gap: '12px 10px', mb: '14px' } as const;

/**
 * Bench, day, from, to, what for, and instruments. What was refused stands where it can be mended. A phone's half-high
 * sheet names bench and day in its head, so times and instruments come first there.
 */
export function BookForm(props: BookFormProps) {
  const { form, benches, laneIds, askedCheckId, refusal, failure, isBusy, onTake, onRetry } = props;
  const { control, setValue, getValues } = form;
  const values = useWatch({ control, compute: (now) => ({ ...now }) });
  const times = readTimes(values);
  const day = values.day || getValues('day');
  const taken = useQuery({ ...bookingsQuery(day, 1), enabled: times !== undefined }).data ?? [];
  const instruments = useQuery(instrumentsQuery(day)).data ?? [];
  const isPhone = usePhone();
  const place = (
    <BenchAndDay control={control} benches={benches} holder={holderOf(values.benchId, times, taken)} />
  );
  const hours = <Times control={control} minutes={times?.minutes} />;
  const purpose = <WorkingOn form={form} askedCheckId={askedCheckId} />;
  const rows = (
    <InstrumentRows
      instruments={instruments}
      laneIds={laneIds}
      chosen={values.instrumentIds}
      times={times}
      bookings={taken}
      errors={refusal?.resources ?? {}}
      hasHeading={!isPhone}
      onChange={(chosen) => setValue('instrumentIds', chosen, { shouldDirty: true })}
    />
  );
  return (
    <>
      {refusal?.detail && (
        <Box sx={{ mb: '14px' }}>
          <RefusalBanner refusal={refusal} isBusy={isBusy} onTake={onTake} />
        </Box>
      )}
      {failure !== undefined && (
        <Box sx={{ mb: '14px' }}>
          <ProblemAlert error={failure} title="The booking was not made." onRetry={onRetry} />
        </Box>
      )}
      {isPhone ? (
        <>
          {hours}
          {rows}
          {place}
          {purpose}
        </>
      ) : (
        <>
          {place}
          {hours}
          {purpose}
          {rows}
        </>
      )}
    </>
  );
}

interface BenchAndDayProps {
  control: Control<BookingValues>;
  benches: readonly Bench[];
  holder: Booking | undefined;
}

function BenchAndDay({ control, benches, holder }: BenchAndDayProps) {
  return (
    <Box sx={PAIR}>
      <FormSelect
        control={control}
        name="benchId"
        label="Bench"
        options={[
          ...benches.map(({ id, tag }) => ({ value: id, label: tag })),
          { value: '', label: 'No bench' },
        ]}
        hint={holder && holderWords(holder)}
      />
      <FormText control={control} name="day" label="Day" type="date" rules={{ required: 'Choose a day.' }} />
    </Box>
  );
}

function Times({ control, minutes = 0 }: { control: Control<BookingValues>; minutes: number | undefined }) {
  return (
    <Box sx={PAIR}>
      <FormText
        control={control}
        name="from"
        label="From"
        inputMode="numeric"
        rules={{
          validate: (text: string, all: BookingValues) =>
            clockProblem(text) ?? skippedProblem(all.day, text) ?? true,
        }}
      />
      <FormText
        control={control}
        name="to"
        label="To"
        inputMode="numeric"
        end={minutes > 0 ? lengthText(minutes) : undefined}
        rules={{ validate: (_text: string, all: BookingValues) => endProblem(all) ?? true }}
      />
    </Box>
  );
}

/** The check and the group it is for; a person without open checks or groups is not asked. */
function WorkingOn({ form, askedCheckId }: Pick<BookFormProps, 'form' | 'askedCheckId'>) {
  const checks = openChecks(useQuery(myBuildsQuery).data ?? [], askedCheckId);
  const groups = useQuery(myGroupsQuery).data ?? [];
  const { control } = form;
  return (
    <Box sx={{ display: 'grid', gap: '12px', mb: '14px' }}>
      {checks.length > 0 && (
        <FormSelect
          control={control}
          name="checkId"
          label="Working on"
          options={[
            { value: '', label: 'Nothing in particular' },
            ...checks.map(({ checkId, words }) => ({ value: checkId, label: words })),
          ]}
        />
      )}
      {groups.length > 0 && (
        <FormSelect
          control={control}
          name="groupId"
          label="Together with"
          options={[
            { value: '', label: 'On my own' },
            ...groups.map(({ id, name }) => ({ value: id, label: name })),
          ]}
        />
      )}
    </Box>
  );
}
