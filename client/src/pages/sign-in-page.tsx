import { AuthFrame } from '../features/auth/components/auth-frame';
import { SignInForm } from '../features/auth/components/sign-in-form';
import { usePageTitle } from '../hooks/use-page-title';
import { useWords } from '../hooks/use-words';
import { paths } from '../lib/paths';

export default function SignInPage() {
  const { say } = useWords();
  usePageTitle(say('auth.signIn.title'));
  return (
    <AuthFrame
      title={say('auth.signIn.title')}
      other={{
        question: say('auth.signIn.other'),
        link: say('auth.signIn.otherLink'),
        to: paths.signUp,
      }}
    >
      <SignInForm />
    </AuthFrame>
  );
}
