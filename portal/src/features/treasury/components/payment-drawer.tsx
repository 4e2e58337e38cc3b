import Button from '@mui/material/Button';
import { useState } from 'react';
import { useForm, useWatch, type UseFormReturn } from 'react-hook-form';
import { carryOut } from '../../../api-client/carry-out';
import { ProblemError } from '../../../api-client/problem-error';
import { applyProblemToForm } from '../../../api-client/problem-to-form';
import { clubDay } from '../../../lib/club-time';
import { formatAmount, formatMoney } from '../../../lib/money';
import { newId } from '../../../lib/new-id';
import { DockedDrawer } from '../../../shared-ui/docked-drawer';
import { FormText, FormToggle } from '../../../shared-ui/form/form-fields';
import { ProblemAlert } from '../../../shared-ui/problem-alert';
import { useToast } from '../../../shared-ui/toasts';
import { useFormDraft } from '../../../shared-ui/use-form-draft';
import { useTakeBackPayment, useTakePayment, type OpenInvoice } from '../api/treasury';
import { amountFault, emptyPayment, paymentBody, type PaymentFields } from '../payment-fields';
import { DrawerForm } from './drawer-form';
import { InvoiceTicks } from './invoice-ticks';
import { MemberSelect } from './member-select';

interface PaymentDrawerProps {
  /** The invoice it was opened on, if it was. */
  invoice: OpenInvoice | undefined;
  currency: string;
  onClose: () => void;
}

const METHODS = [
  { value: 'cash', label: 'Cash' },
  { value: 'cheque', label: 'Cheque' },
  { value: 'transfer', label: 'Transfer' },
] as const;

const startOf = (invoice: OpenInvoice | undefined): PaymentFields => ({
  ...emptyPayment(clubDay(), newId()),
  ...(invoice && {
    personId: invoice.personId,
    invoiceIds: [invoice.id],
    amount: formatAmount(invoice.openMinor),
  }),
});

/** Writes down cash, a cheque or a transfer. What is typed is kept on the device until it is taken. */
export function PaymentDrawer({ invoice, currency, onClose }: PaymentDrawerProps) {
  const [start] = useState(() => startOf(invoice));
  const form = useForm<PaymentFields>({ defaultValues: start });
  const { handleSubmit, setError, setValue } = form;
  const draft = useFormDraft(form, `payment:${invoice?.id ?? 'any'}`);
  const take = useTakePayment();
  const takeBack = useTakeBackPayment();
  const say = useToast();
  const submit = handleSubmit((fields) =>
    carryOut(take, paymentBody(fields), {
      onSuccess: ({ id, receiptNumber, amountMinor, personName }) => {
        draft.drop();
        say(`${formatMoney(amountMinor, currency)} from ${personName} taken, ${receiptNumber}.`, () =>
          takeBack.mutate(id),
        );
        onClose();
      },
      onError: (error) => {
        applyProblemToForm(setError, error, ['personId', 'receivedOn', 'note']);
        if (error instanceof ProblemError && error.is('payment-key-used')) setValue('clientKey', newId());
      },
    }),
  );
  return (
    <DockedDrawer
      open
      title="Take a payment"
      onClose={onClose}
      footer={
        <Button variant="contained" fullWidth loading={take.isPending} onClick={() => void submit()}>
          Take the payment
        </Button>
      }
    >
      <PaymentForm
        form={form}
        keptFrom={draft.keptFrom}
        currency={currency}
        error={take.error}
        onSubmit={() => void submit()}
      />
    </DockedDrawer>
  );
}

interface PaymentFormProps {
  form: UseFormReturn<PaymentFields>;
  keptFrom: string | undefined;
  currency: string;
  error: unknown;
  onSubmit: () => void;
}

function PaymentForm({ form: { control, setValue }, keptFrom, currency, error, onSubmit }: PaymentFormProps) {
  const personId = useWatch({ control, name: 'personId' });
  return (
    <DrawerForm keptFrom={keptFrom} onSubmit={onSubmit}>
      <MemberSelect control={control} name="personId" label="From" missing="Choose who paid." />
      {personId && <InvoiceTicks key={personId} control={control} setValue={setValue} personId={personId} />}
      <FormToggle control={control} name="method" label="How" options={METHODS} />
      <FormText
        control={control}
        name="amount"
        label="Amount"
        inputMode="decimal"
        end={currency}
        rules={{ validate: (text) => amountFault(text) ?? true }}
        hint="More than is open becomes credit for the next invoice."
      />
      <FormText
        control={control}
        name="receivedOn"
        label="Received on"
        type="date"
        rules={{ required: 'Choose the day.' }}
      />
      <FormText
        control={control}
        name="note"
        label="Note"
        maxLength={200}
        hint="For the books, such as a cheque’s number."
      />
      {error !== null && <ProblemAlert error={error} title="The payment was not taken." />}
    </DrawerForm>
  );
}
