import Box from '@mui/material/Box';
import Button from '@mui/material/Button';
import { useQuery } from '@tanstack/react-query';
import { useForm } from 'react-hook-form';
import { carryOut } from '../../../api-client/carry-out';
import { applyProblemToForm } from '../../../api-client/problem-to-form';
import { FormSelect, FormText } from '../../../shared-ui/form/form-fields';
import { ProblemAlert } from '../../../shared-ui/problem-alert';
import { useToast } from '../../../shared-ui/toasts';
import { useFormDraft } from '../../../shared-ui/use-form-draft';
import { peopleQuery, useGrantClearance, type Instrument } from '../api/instruments';

const EMPTY = { personId: '', kindId: '', until: '' };

/** Clears somebody on a kind of instrument; clearing again renews. */
export function ClearanceForm({ instruments }: { instruments: readonly Instrument[] }) {
  const people = useQuery(peopleQuery).data ?? [];
  const grant = useGrantClearance();
  const say = useToast();
  const form = useForm({ defaultValues: EMPTY });
  const draft = useFormDraft(form, 'clearance');
  const kinds = new Map(
    instruments.filter(({ kind }) => kind.needsClearance).map(({ kind }) => [kind.id, kind.name]),
  );
  const choose = { value: '', label: 'Choose' };
  const send = form.handleSubmit(({ personId, kindId, until }) =>
    carryOut(
      grant,
      { personId, kindId, ...(until && { until }) },
      {
        onSuccess: ({ personName, kindName }) => {
          draft.drop();
          form.reset(EMPTY);
          say(`${personName} is cleared on ${kindName}.`);
        },
        onError: (error) => applyProblemToForm(form.setError, error, ['personId', 'kindId', 'until']),
      },
    ),
  );
  return (
    <Box
      component="form"
      noValidate
      aria-label="Give a clearance"
      onSubmit={(event) => void send(event)}
      sx={{ display: 'grid', gridTemplateColumns: { sm: '1fr 1fr' }, gap: '12px 10px', py: '12px' }}
    >
      <FormSelect
        control={form.control}
        name="personId"
        label="Member"
        options={[choose, ...people.map(({ id, name }) => ({ value: id, label: name }))]}
        rules={{ required: 'Choose a member.' }}
      />
      <FormSelect
        control={form.control}
        name="kindId"
        label="On the"
        options={[choose, ...[...kinds].map(([value, label]) => ({ value, label }))]}
        rules={{ required: 'Choose a kind of instrument.' }}
      />
      <FormText control={form.control} name="until" label="Until" type="date" hint="Empty for no end" />
      <Box sx={{ pt: '20px' }}>
        <Button type="submit" variant="contained" fullWidth loading={grant.isPending}>
          Clear them
        </Button>
      </Box>
      {grant.isError && <ProblemAlert error={grant.error} title="The clearance was not given." />}
    </Box>
  );
}
