import Box from '@mui/material/Box';
import Button from '@mui/material/Button';
import { useState } from 'react';
import { useForm } from 'react-hook-form';
import { carryOut } from '../../../api-client/carry-out';
import { applyProblemToForm } from '../../../api-client/problem-to-form';
import { FormSelect, FormText } from '../../../shared-ui/form/form-fields';
import { ProblemAlert } from '../../../shared-ui/problem-alert';
import { SectionHeading } from '../../../shared-ui/section-heading';
import { useToast } from '../../../shared-ui/toasts';
import { useFormDraft } from '../../../shared-ui/use-form-draft';
import { useChangeCalibration, useChangeCondition, type Instrument } from '../api/instruments';
import { OutOfUseDialog } from './out-of-use-dialog';

const NOTE = { required: 'Say in a few words why.' };
const FORM = { display: 'grid', gap: '12px', p: '10px 0 18px' } as const;

type Condition = Instrument['condition'];

interface ConditionFields {
  condition: Condition;
  note: string;
}

const CONDITIONS: { value: Condition; label: string }[] = [
  { value: 'ready', label: 'Ready' },
  { value: 'in repair', label: 'In repair' },
  { value: 'out of use', label: 'Out of use' },
];

/** Puts an instrument in repair, out of use or back in use. The note is what members read. */
export function ConditionForm({ instrument }: { instrument: Instrument }) {
  const { id: instrumentId, tag, condition } = instrument;
  const change = useChangeCondition();
  const say = useToast();
  const form = useForm<ConditionFields>({ defaultValues: { condition, note: '' } });
  const draft = useFormDraft(form, `condition:${instrumentId}`);
  const [asking, setAsking] = useState<ConditionFields>();
  const send = (values: ConditionFields) =>
    carryOut(
      change,
      { instrumentId, ...values },
      {
        onSuccess: () => {
          draft.drop();
          form.reset({ ...values, note: '' });
          setAsking(undefined);
          say(`${tag} is ${values.condition}.`);
        },
        onError: (error) => {
          setAsking(undefined);
          applyProblemToForm(form.setError, error, ['condition', 'note']);
        },
      },
    );
  // Others are affected only when it is taken from them.
  const ask = form.handleSubmit((values) =>
    values.condition === 'ready' || condition !== 'ready' ? send(values) : setAsking(values),
  );
  return (
    <Box component="form" noValidate aria-label="Condition" onSubmit={(event) => void ask(event)}>
      {asking && (
        <OutOfUseDialog
          instrument={instrument}
          condition={asking.condition}
          isBusy={change.isPending}
          onAct={() => send(asking)}
          onStay={() => setAsking(undefined)}
        />
      )}
      <SectionHeading end={draft.keptFrom}>Condition</SectionHeading>
      <Box sx={FORM}>
        <FormSelect control={form.control} name="condition" label="From now on" options={CONDITIONS} />
        <FormText
          control={form.control}
          name="note"
          label="What is wrong, or what was put right"
          rows={2}
          maxLength={500}
          rules={NOTE}
        />
        {change.isError && <ProblemAlert error={change.error} title="It was not changed." />}
        <Button type="submit" loading={change.isPending}>
          Keep the condition
        </Button>
      </Box>
    </Box>
  );
}

/** Sets the last day on which the calibration holds. */
export function CalibrationForm({ instrument }: { instrument: Instrument }) {
  const { id: instrumentId, tag, calibrationDueOn } = instrument;
  const change = useChangeCalibration();
  const say = useToast();
  const form = useForm({ defaultValues: { dueOn: calibrationDueOn ?? '', note: '' } });
  const draft = useFormDraft(form, `calibration:${instrumentId}`);
  const send = form.handleSubmit((values) =>
    carryOut(
      change,
      { instrumentId, ...values },
      {
        onSuccess: () => {
          draft.drop();
          form.reset({ ...values, note: '' });
          say(`${tag} is calibrated.`);
        },
        onError: (error) => applyProblemToForm(form.setError, error, ['dueOn', 'note']),
      },
    ),
  );
  return (
    <Box component="form" noValidate aria-label="Calibration" onSubmit={(event) => void send(event)}>
      <SectionHeading end={draft.keptFrom}>Calibration</SectionHeading>
      <Box sx={FORM}>
        <FormText
          control={form.control}
          name="dueOn"
          label="Good until"
          type="date"
          rules={{ required: 'Choose the last good day.' }}
        />
        <FormText
          control={form.control}
          name="note"
          label="Who calibrated it, and how it came out"
          rows={2}
          maxLength={500}
          rules={NOTE}
        />
        {change.isError && <ProblemAlert error={change.error} title="It was not changed." />}
        <Button type="submit" loading={change.isPending}>
          Keep the calibration
        </Button>
      </Box>
    </Box>
  );
}
