import { AuthFrame } from '../features/auth/components/auth-frame';
import { SignUpForm } from '../features/auth/components/sign-up-form';
import { usePageTitle } from '../hooks/use-page-title';
import { useWords } from '../hooks/use-words';
import { paths } from '../lib/paths';

export default function SignUpPage() {
  const { say } = useWords();
  usePageTitle(say('auth.signUp.title'));
  return (
    <AuthFrame
      long
      title={say('auth.signUp.title')}
      other={{
        question: say('auth.signUp.other'),
        link: say('auth.signUp.otherLink'),
        to: paths.signIn,
      }}
    >
      <SignUpForm />
    </AuthFrame>
  );
}
