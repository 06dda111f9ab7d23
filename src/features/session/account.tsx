import { useNavigate } from 'react-router';
import { sayError } from '../../lib/say-error.ts';
import { Button } from '../../ui/button.tsx';
import { useSignOut } from './api/sign-out.ts';
import type { SignedIn } from './signed-in.tsx';

/** Who is signed in, as what, and the way out. */
export function Account({ user }: Pick<SignedIn, 'user'>) {
  const navigate = useNavigate();
  const signOut = useSignOut(() => void navigate('/sign-in'));
  return (
    <div className="flex shrink-0 items-center gap-4 text-12">
      <span title={`${user.name}, ${user.role}`} className="max-w-60 truncate text-pencil">
        {user.name}, {user.role}
      </span>
      <Button kind="quiet" busy={signOut.isPending ? 'Signing out' : ''} onClick={() => signOut.mutate()}>
        Sign out
      </Button>
      {signOut.isError && (
        <span role="alert" className="text-stop">
          {sayError(signOut.error)}
        </span>
      )}
    </div>
  );
}
