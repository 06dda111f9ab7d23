import { useNavigate } from 'react-router';
import { Dialog } from '../../ui/dialog.tsx';
import { SignInForm } from './sign-in-form.tsx';

/** The session ended under a page that is still open: sign in over it, so that nothing typed is lost. */
export function SignInAgain({ email }: { readonly email: string }) {
  const navigate = useNavigate();
  return (
    <Dialog title="You are signed out" onClose={() => void navigate('/sign-in')}>
      <p className="mb-3">The session has ended. Sign in again and go on; the page keeps what you typed.</p>
      <SignInForm email={email} />
    </Dialog>
  );
}
