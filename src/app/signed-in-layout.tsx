import { useState } from 'react';
import { Navigate, Outlet, useLocation } from 'react-router';
import { Account } from '../features/session/account.tsx';
import { useSession } from '../features/session/api/get-session.ts';
import { SignInAgain } from '../features/session/sign-in-again.tsx';
import { SignedInProvider, type SignedIn } from '../features/session/signed-in.tsx';
import { Fetched } from '../ui/fetched.tsx';
import { Sheet } from '../ui/sheet.tsx';
import { SheetChromeProvider } from '../ui/sheet-chrome.tsx';
import { navOf } from './nav.ts';

/** Pages of a shop. Without a session it leads to the sign-in page; when a session ends under an open page, the page stays. */
export function SignedInLayout() {
  const session = useSession();
  const location = useLocation();
  const [last, setLast] = useState<SignedIn | null>(null);

  const { user, shop } = session.data ?? {};
  const now = user && shop ? { user, shop } : null;
  if (now !== null && (now.user !== last?.user || now.shop !== last?.shop)) setLast(now);

  if (session.data === undefined) {
    return (
      <Sheet title="Stilepost" showTitle={false}>
        <Fetched query={session} what="your session">
          {() => null}
        </Fetched>
      </Sheet>
    );
  }
  const signedIn = now ?? last;
  if (signedIn === null) {
    const next = location.pathname + location.search;
    return <Navigate to={next === '/jobs' ? '/sign-in' : `/sign-in?next=${encodeURIComponent(next)}`} replace />;
  }
  return (
    <SignedInProvider value={signedIn}>
      <SheetChromeProvider
        value={{
          nav: navOf(signedIn.user.role),
          account: <Account user={signedIn.user} />,
          shopName: signedIn.shop.name,
        }}
      >
        {/* Another person's page must not keep the state of the one before. */}
        <Outlet key={signedIn.user.id} />
        {now === null && <SignInAgain email={signedIn.user.email} />}
      </SheetChromeProvider>
    </SignedInProvider>
  );
}
