import { LIMITS } from '@fairlead/shared';
import { Button, PasswordInput, TextInput } from '@mantine/core';
import { useForm } from '@mantine/form';
import { useSendForm } from '../../../hooks/use-send-form';
import { useWords } from '../../../hooks/use-words';
import { signUp } from '../api/session-requests';
import { authRules } from './auth-rules';
import { FormFailure } from './form-failure';
import classes from './auth.module.css';

export function SignUpForm() {
  const { say } = useWords();
  const rules = authRules(say);
  const form = useForm({
    mode: 'uncontrolled',
    initialValues: { name: '', email: '', password: '', companyName: '' },
    validate: {
      name: rules.name,
      email: rules.email,
      password: rules.newPassword,
      companyName: rules.companyName,
    },
  });
  const { submit, failure, sending } = useSendForm({
    form,
    taken: { field: 'email', words: say('auth.problem.emailTaken') },
    send: (values) =>
      signUp({
        name: values.name.trim(),
        email: values.email.trim(),
        password: values.password,
        companyName: values.companyName.trim(),
        timeZone: Intl.DateTimeFormat().resolvedOptions().timeZone,
      }),
  });

  return (
    <form className={classes.form} onSubmit={submit} noValidate>
      <TextInput
        label={say('auth.field.name')}
        autoComplete="name"
        key={form.key('name')}
        {...form.getInputProps('name')}
      />
      <TextInput
        label={say('auth.field.email')}
        type="email"
        autoComplete="username"
        autoCapitalize="none"
        spellCheck={false}
        key={form.key('email')}
        {...form.getInputProps('email')}
      />
      <PasswordInput
        label={say('auth.field.password')}
        description={say('auth.hint.password', { min: LIMITS.passwordMin })}
        autoComplete="new-password"
        visibilityToggleButtonProps={{ 'aria-label': say('auth.showPassword') }}
        key={form.key('password')}
        {...form.getInputProps('password')}
      />
      <TextInput
        label={say('auth.field.shop')}
        autoComplete="organization"
        key={form.key('companyName')}
        {...form.getInputProps('companyName')}
      />
      <FormFailure words={failure} />
      <Button type="submit" variant="filled" fullWidth loading={sending}>
        {say('auth.signUp.submit')}
      </Button>
    </form>
  );
}
