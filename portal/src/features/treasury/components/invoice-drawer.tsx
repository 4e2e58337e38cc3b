import Button from '@mui/material/Button';
import { useState } from 'react';
import { useForm } from 'react-hook-form';
import { carryOut } from '../../../api-client/carry-out';
import { applyProblemToForm } from '../../../api-client/problem-to-form';
import { addDays, clubDay } from '../../../lib/club-time';
import { formatMoney } from '../../../lib/money';
import { DockedDrawer } from '../../../shared-ui/docked-drawer';
import { FormText, FormToggle } from '../../../shared-ui/form/form-fields';
import { ProblemAlert } from '../../../shared-ui/problem-alert';
import { useToast } from '../../../shared-ui/toasts';
import { useFormDraft } from '../../../shared-ui/use-form-draft';
import { useRaiseInvoice } from '../api/treasury';
import { amountFault } from '../payment-fields';
import { emptyInvoice, invoiceBody, type RaiseFields } from '../raise-fields';
import { DrawerForm } from './drawer-form';
import { MemberSelect } from './member-select';

const KINDS = [
  { value: 'dues', label: 'Dues' },
  { value: 'course fee', label: 'Course fee' },
  { value: 'kit', label: 'Kit' },
] as const;

/** Time to pay that a new invoice proposes. */
const DAYS_TO_PAY = 30;

interface InvoiceDrawerProps {
  currency: string;
  onClose: () => void;
}

/** Raises one invoice. What is typed is kept on the device until it is raised. */
export function InvoiceDrawer({ currency, onClose }: InvoiceDrawerProps) {
  const [start] = useState(() => emptyInvoice(addDays(clubDay(), DAYS_TO_PAY)));
  const form = useForm<RaiseFields>({ defaultValues: start });
  const { control, handleSubmit, setError } = form;
  const draft = useFormDraft(form, 'invoice');
  const raise = useRaiseInvoice();
  const say = useToast();
  const submit = handleSubmit((fields) =>
    carryOut(raise, invoiceBody(fields), {
      onSuccess: ({ number, amountMinor, personName }) => {
        draft.drop();
        say(`${formatMoney(amountMinor, currency)} to ${personName} raised, ${number}.`);
        onClose();
      },
      onError: (error) => applyProblemToForm(setError, error, ['personId', 'description', 'dueOn']),
    }),
  );
  return (
    <DockedDrawer
      open
      title="Raise an invoice"
      onClose={onClose}
      footer={
        <Button variant="contained" fullWidth loading={raise.isPending} onClick={() => void submit()}>
          Raise the invoice
        </Button>
      }
    >
      <DrawerForm keptFrom={draft.keptFrom} onSubmit={() => void submit()}>
        <MemberSelect control={control} name="personId" label="To" missing="Choose who is to pay." />
        <FormToggle control={control} name="kind" label="For" options={KINDS} />
        <FormText
          control={control}
          name="description"
          label="In words"
          maxLength={120}
          rules={{ validate: (text) => text.trim() !== '' || 'Say what it is for.' }}
          hint="As the member reads it, such as Dues, January to March."
        />
        <FormText
          control={control}
          name="amount"
          label="Amount"
          inputMode="decimal"
          end={currency}
          rules={{ validate: (text) => amountFault(text) ?? true }}
          hint="Credit they have on account pays it first."
        />
        <FormText
          control={control}
          name="dueOn"
          label="Due on"
          type="date"
          rules={{ required: 'Choose the day.' }}
        />
        {raise.isError && <ProblemAlert error={raise.error} title="The invoice was not raised." />}
      </DrawerForm>
    </DockedDrawer>
  );
}
