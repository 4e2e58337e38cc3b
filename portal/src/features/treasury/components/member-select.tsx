import { useQuery } from '@tanstack/react-query';
import type { Control, FieldPathByValue, FieldValues } from 'react-hook-form';
import { FormSelect } from '../../../shared-ui/form/form-fields';
import { ProblemAlert } from '../../../shared-ui/problem-alert';
import { peopleQuery } from '../api/treasury';

interface MemberSelectProps<T extends FieldValues> {
  control: Control<T>;
  name: FieldPathByValue<T, string>;
  label: string;
  /** Said when nobody is chosen. */
  missing: string;
}

/** Somebody of the club, by name. */
export function MemberSelect<T extends FieldValues>({ control, name, label, missing }: MemberSelectProps<T>) {
  const people = useQuery(peopleQuery);
  return (
    <>
      <FormSelect
        control={control}
        name={name}
        label={label}
        rules={{ required: missing }}
        options={[
          { value: '', label: 'Choose' },
          ...(people.data?.items ?? []).map(({ id, name: who }) => ({ value: id, label: who })),
        ]}
      />
      {people.isError && <ProblemAlert error={people.error} onRetry={() => void people.refetch()} />}
    </>
  );
}
