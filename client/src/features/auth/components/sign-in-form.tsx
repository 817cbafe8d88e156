import { Button, PasswordInput, TextInput } from '@mantine/core';
import { useForm } from '@mantine/form';
import { useSendForm } from '../../../hooks/use-send-form';
import { useWords } from '../../../hooks/use-words';
import { useSession } from '../../../lib/session';
import { signIn } from '../api/session-requests';
import { authRules } from './auth-rules';
import { FormFailure } from './form-failure';
import classes from './auth.module.css';

export function SignInForm() {
  const { say } = useWords();
  const left = useSession((session) => session.left);
  const rules = authRules(say);
  const form = useForm({
    mode: 'uncontrolled',
    initialValues: { email: '', password: '' },
    validate: { email: rules.email, password: rules.password },
  });
  const { submit, failure, sending } = useSendForm({
    form,
    send: ({ email, password }) => signIn({ email: email.trim(), password }),
  });
  const ranOut = left === 'ran-out' ? say('auth.session.ended') : null;

  return (
    <form className={classes.form} onSubmit={submit} noValidate>
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
        autoComplete="current-password"
        visibilityToggleButtonProps={{ 'aria-label': say('auth.showPassword') }}
        key={form.key('password')}
        {...form.getInputProps('password')}
      />
      <FormFailure words={failure ?? ranOut} />
      <Button type="submit" variant="filled" fullWidth loading={sending}>
        {say('auth.signIn.submit')}
      </Button>
    </form>
  );
}
