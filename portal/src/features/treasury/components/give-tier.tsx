import Button from '@mui/material/Button';
import { useForm } from 'react-hook-form';
import { carryOut } from '../../../api-client/carry-out';
import { applyProblemToForm } from '../../../api-client/problem-to-form';
import { clubDay } from '../../../lib/club-time';
import { dayText } from '../../../lib/club-time-text';
import { capital } from '../../../lib/text';
import { FormSelect, FormText } from '../../../shared-ui/form/form-fields';
import { ProblemAlert } from '../../../shared-ui/problem-alert';
import { SectionHeading } from '../../../shared-ui/section-heading';
import { useToast } from '../../../shared-ui/toasts';
import { useFormDraft } from '../../../shared-ui/use-form-draft';
import { useGiveTier, type GiveTier as Gift, type Tier } from '../api/tiers';
import { DrawerForm } from './drawer-form';
import { MemberSelect } from './member-select';

const emptyGift = (): Gift => ({ personId: '', tierId: '', fromOn: clubDay() });

/** Puts a member on a tier from a day on; the invoices that were raised before stay as they are. */
export function GiveTier({ tiers }: { tiers: readonly Tier[] }) {
  const form = useForm<Gift>({ defaultValues: emptyGift() });
  const { control, handleSubmit, setError, reset } = form;
  const draft = useFormDraft(form, 'tier of a member');
  const give = useGiveTier();
  const say = useToast();
  const submit = handleSubmit((gift) =>
    carryOut(give, gift, {
      onSuccess: () => {
        const name = tiers.find(({ id }) => id === gift.tierId)?.name ?? '';
        draft.drop();
        reset(emptyGift());
        say(`${capital(name)} tier from ${dayText(gift.fromOn)}.`);
      },
      onError: (error) => applyProblemToForm(setError, error, ['personId', 'tierId', 'fromOn']),
    }),
  );
  return (
    <section aria-labelledby="give-tier">
      <SectionHeading id="give-tier">Give a member a tier</SectionHeading>
      <DrawerForm label="Give a member a tier" keptFrom={draft.keptFrom} onSubmit={() => void submit()}>
        <MemberSelect control={control} name="personId" label="Member" missing="Choose a member." />
        <FormSelect
          control={control}
          name="tierId"
          label="Tier"
          rules={{ required: 'Choose a tier.' }}
          options={[
            { value: '', label: 'Choose' },
            ...tiers.map(({ id, name }) => ({ value: id, label: capital(name) })),
          ]}
        />
        <FormText
          control={control}
          name="fromOn"
          label="From"
          type="date"
          rules={{ required: 'Choose the day.' }}
          hint="Invoices raised before stay as they are."
        />
        {give.isError && <ProblemAlert error={give.error} title="The tier was not given." />}
        <Button variant="contained" fullWidth loading={give.isPending} onClick={() => void submit()}>
          Give the tier
        </Button>
      </DrawerForm>
    </section>
  );
}
