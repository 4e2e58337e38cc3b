import Button from '@mui/material/Button';
import { useForm } from 'react-hook-form';
import { carryOut } from '../../../api-client/carry-out';
import { ProblemError } from '../../../api-client/problem-error';
import { applyProblemToForm } from '../../../api-client/problem-to-form';
import { readMoney } from '../../../lib/money';
import { capital } from '../../../lib/text';
import { FormSelect, FormText } from '../../../shared-ui/form/form-fields';
import { ProblemAlert } from '../../../shared-ui/problem-alert';
import { SectionHeading } from '../../../shared-ui/section-heading';
import { useToast } from '../../../shared-ui/toasts';
import { useFormDraft } from '../../../shared-ui/use-form-draft';
import { useAddTier } from '../api/tiers';
import { amountFault } from '../payment-fields';
import { DrawerForm } from './drawer-form';
import { monthsText } from './tier-list';

const EMPTY = { name: '', amount: '', months: '3' };
const MONTHS = Array.from({ length: 12 }, (_, index) => ({
  value: String(index + 1),
  label: monthsText(index + 1),
}));

/** A new tier; one that is there keeps its amount, because invoices were raised by it. */
export function AddTier({ currency }: { currency: string }) {
  const form = useForm({ defaultValues: EMPTY });
  const { control, handleSubmit, setError, reset } = form;
  const draft = useFormDraft(form, 'tier');
  const add = useAddTier();
  const say = useToast();
  const submit = handleSubmit(({ name, amount, months }) =>
    carryOut(
      add,
      { name: name.trim(), amountMinor: readMoney(amount) ?? 0, months: Number(months) },
      {
        onSuccess: (tier) => {
          draft.drop();
          reset(EMPTY);
          say(`${capital(tier.name)} tier added.`);
        },
        onError: (error) => {
          if (error instanceof ProblemError && error.is('tier-name-taken'))
            setError('name', { type: 'server', message: error.message }, { shouldFocus: true });
          else applyProblemToForm(setError, error, ['name', 'months']);
        },
      },
    ),
  );
  return (
    <section aria-labelledby="add-tier">
      <SectionHeading id="add-tier">Add a tier</SectionHeading>
      <DrawerForm label="Add a tier" keptFrom={draft.keptFrom} onSubmit={() => void submit()}>
        <FormText
          control={control}
          name="name"
          label="Name"
          maxLength={40}
          rules={{ validate: (text) => text.trim() !== '' || 'Give it a name.' }}
        />
        <FormText
          control={control}
          name="amount"
          label="Amount"
          inputMode="decimal"
          end={currency}
          rules={{ validate: (text) => amountFault(text) ?? true }}
        />
        <FormSelect control={control} name="months" label="For" options={MONTHS} />
        {add.isError && <ProblemAlert error={add.error} title="The tier was not added." />}
        <Button fullWidth loading={add.isPending} onClick={() => void submit()}>
          Add the tier
        </Button>
      </DrawerForm>
    </section>
  );
}
