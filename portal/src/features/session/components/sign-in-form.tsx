import Box from '@mui/material/Box';
import Button from '@mui/material/Button';
import { useEffect } from 'react';
import { useForm, useWatch } from 'react-hook-form';
import type { Club } from '../../../api-client/club';
import { ProblemError } from '../../../api-client/problem-error';
import { applyProblemToForm } from '../../../api-client/problem-to-form';
import { useSignIn } from '../../../api-client/session';
import { dropDraft, keepDraft, readDraft } from '../../../lib/drafts';
import { FormCheck, FormText } from '../../../shared-ui/form/form-fields';
import { usePreference } from '../../../shared-ui/use-preference';
import { DemoAccounts } from './demo-accounts';
import { PasswordField } from './password-field';
import type { SignInFields } from './sign-in-fields';
import { SignInProblem } from './sign-in-problem';

/** The typed address comes back after a reload, and belongs to nobody yet. The password never leaves the field. */
const NOBODY = 'nobody';
const PLACE = 'sign-in';

interface SignInFormProps {
  demoAccounts: Club['demoAccounts'];
}

/** On success the session is known, and the page around it moves on. */
export function SignInForm({ demoAccounts }: SignInFormProps) {
  const [tablet, setTablet] = usePreference('shared-tablet', ['no', 'yes']);
  const form = useForm<SignInFields>({
    defaultValues: {
      email: readDraft<string>(NOBODY, PLACE)?.value ?? '',
      password: '',
      sharedDevice: tablet === 'yes',
    },
  });
  const signIn = useSignIn();
  const email = useWatch({ control: form.control, name: 'email' });
  useEffect(() => void (email ? keepDraft(NOBODY, PLACE, email) : dropDraft(NOBODY, PLACE)), [email]);
  const submit = form.handleSubmit((fields) => {
    setTablet(fields.sharedDevice ? 'yes' : 'no');
    signIn.mutate(fields, {
      // Whoever comes to a shared tablet next begins with an empty field.
      onSuccess: () => dropDraft(NOBODY, PLACE),
      onError: (error) => {
        if (error instanceof ProblemError && error.is('wrong-email-or-password')) {
          form.resetField('password');
          form.setFocus('password');
        }
        applyProblemToForm(form.setError, error, ['email', 'password']);
      },
    });
  });
  const choose = (email: string, password: string) => {
    form.setValue('email', email, { shouldValidate: true });
    form.setValue('password', password, { shouldValidate: true });
  };
  return (
    <>
      <Box
        component="form"
        noValidate
        onSubmit={(event) => void submit(event)}
        sx={{ display: 'grid', gap: '14px' }}
      >
        <FormText
          control={form.control}
          name="email"
          rules={{ required: 'Type your email address' }}
          label="Email address"
          type="email"
          autoComplete="username"
          maxLength={254}
          autoFocus
        />
        <PasswordField control={form.control} />
        <FormCheck
          control={form.control}
          name="sharedDevice"
          label="This is a shared bench tablet"
          hint="Signs you out after ten minutes untouched. Your typing is kept until you return."
        />
        {signIn.isError && <SignInProblem error={signIn.error} />}
        <Button type="submit" variant="contained" fullWidth loading={signIn.isPending} sx={{ minHeight: 50 }}>
          Sign in
        </Button>
      </Box>
      <DemoAccounts accounts={demoAccounts} onChoose={choose} />
    </>
  );
}
