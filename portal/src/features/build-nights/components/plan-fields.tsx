import Box from '@mui/material/Box';
import { useQuery } from '@tanstack/react-query';
import { Controller, useWatch, type Control } from 'react-hook-form';
import { listText } from '../../../lib/text';
import { MultiSelectField } from '../../../shared-ui/fields/multi-select-field';
import { SelectField } from '../../../shared-ui/fields/select-field';
import { TextField } from '../../../shared-ui/fields/text-field';
import type { Choice } from '../api/choices';
import { benchChoicesQuery, mentorChoicesQuery, stageChoicesQuery } from '../api/choices';
import { benchWords } from '../night-words';
import type { PlanForm } from '../plan-form';

type Errors = Partial<Record<keyof PlanForm, string>>;

interface PlanFieldsProps {
  control: Control<PlanForm>;
  errors: Errors;
  /** Only one night is changed: how it repeats is not asked. */
  isOneNight?: boolean;
}

const REPEATS = [
  { value: 'each week', label: 'Each week' },
  { value: 'every second week', label: 'Every second' },
  { value: 'once', label: 'Once' },
];

/** What a night or a series is made of. */
export function PlanFields({ control, errors, isOneNight = false }: PlanFieldsProps) {
  const repeats = useWatch({ control, name: 'repeats' });
  const isSeries = !isOneNight && repeats !== 'once';
  const text = { control, errors };
  return (
    <Box sx={{ display: 'grid', gap: '10px' }}>
      <Text {...text} name="title" label="Name" maxLength={80} />
      <Box
        sx={{
          display: 'grid',
          gap: '10px',
          gridTemplateColumns: { xs: '1fr 1fr', md: isSeries ? '122px 1fr 56px' : '1fr 1fr' },
        }}
      >
        {!isOneNight && <Repeats control={control} />}
        <Text {...text} name="first" label={isSeries ? 'First' : 'Day'} type="date" />
        {isSeries && <Text {...text} name="nights" label="Nights" inputMode="numeric" />}
      </Box>
      <Box sx={{ display: 'grid', gap: '10px', gridTemplateColumns: '1fr 1fr 1fr' }}>
        <Text {...text} name="from" label="From" />
        <Text {...text} name="to" label="To" />
        <Text {...text} name="places" label="Places" inputMode="numeric" />
      </Box>
      <PlanChoices control={control} errors={errors} />
      <Text {...text} name="note" label="Note for everybody" maxLength={1000} rows={1} />
    </Box>
  );
}

interface TextProps {
  control: Control<PlanForm>;
  errors: Errors;
  name: 'title' | 'first' | 'nights' | 'from' | 'to' | 'places' | 'note';
  label: string;
  type?: 'date';
  inputMode?: 'numeric';
  maxLength?: number;
  rows?: number;
}

function Text({ control, errors, name, ...own }: TextProps) {
  return (
    <Controller
      control={control}
      name={name}
      render={({ field: { ref, ...field }, fieldState }) => (
        <TextField {...own} {...field} inputRef={ref} error={fieldState.error?.message ?? errors[name]} />
      )}
    />
  );
}

function Repeats({ control }: { control: Control<PlanForm> }) {
  return (
    <Controller
      control={control}
      name="repeats"
      render={({ field: { ref, ...field } }) => (
        <SelectField {...field} inputRef={ref} label="Repeats" options={REPEATS} />
      )}
    />
  );
}

/** Benches, mentors and stages, each as a list to tick. */
function PlanChoices({ control, errors }: { control: Control<PlanForm>; errors: Errors }) {
  const benches = useQuery(benchChoicesQuery).data ?? [];
  const mentors = useQuery(mentorChoicesQuery).data ?? [];
  const stages = useQuery(stageChoicesQuery).data ?? [];
  return (
    <>
      <Box sx={{ display: 'grid', gap: '10px', gridTemplateColumns: '1fr 1fr' }}>
        <Several
          {...{ control, errors }}
          name="benchIds"
          label="Benches"
          choices={benches}
          words={(labels) => benchWords(labels).replace(/^Bench(es)? /, '') || 'None'}
        />
        <Several
          {...{ control, errors }}
          name="mentorIds"
          label="Mentor on duty"
          choices={mentors}
          words={(labels) => mentorWords(labels) || 'Nobody'}
        />
      </Box>
      <Several
        {...{ control, errors }}
        name="stageIds"
        label="Stages in focus"
        choices={stages}
        words={(labels) => labels.join(', ') || 'None'}
      />
    </>
  );
}

const mentorWords = (names: readonly string[]): string =>
  names.length === 1 ? names[0] : listText(names.map((name) => name.split(' ')[0]));

interface SeveralProps {
  control: Control<PlanForm>;
  errors: Errors;
  name: 'benchIds' | 'mentorIds' | 'stageIds';
  label: string;
  choices: readonly Choice[];
  words: (labels: string[]) => string;
}

function Several({ control, errors, name, label, choices, words }: SeveralProps) {
  return (
    <Controller
      control={control}
      name={name}
      render={({ field, fieldState }) => (
        <MultiSelectField
          label={label}
          values={field.value}
          options={choices}
          words={words(
            choices.filter(({ value }) => field.value.includes(value)).map((choice) => choice.label),
          )}
          onChange={field.onChange}
          error={fieldState.error?.message ?? errors[name]}
        />
      )}
    />
  );
}
