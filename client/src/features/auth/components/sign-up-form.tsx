import { LIMITS } from '@fairlead/shared';
import { Button, PasswordInput, TextInput } from '@mantine/core';
import { useWords } from '../../../hooks/use-words';
import { signUp } from '../api/session-requests';
import { authRules } from './auth-rules';
import { FormFailure } from './form-failure';
import { useAuthForm } from './use-auth-form';
import classes from './auth.module.css';

export function SignUpForm() {
  const { say } = useWords();
  const rules = authRules(say);
  const { form, submit, failure, sending } = useAuthForm(
    {
      initialValues: { name: '', email: '', password: '', companyName: '' },
      validate: {
        name: rules.line(LIMITS.personName),
        email: rules.email,
        password: rules.newPassword,
        companyName: rules.line(LIMITS.companyName),
      },
    },
    (values) =>
      signUp({
        name: values.name.trim(),
        email: values.email.trim(),
        password: values.password,
        companyName: values.companyName.trim(),
        timeZone: Intl.DateTimeFormat().resolvedOptions().timeZone,
      }),
  );

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
