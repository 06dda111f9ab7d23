import { Link, Outlet, useLocation } from 'react-router';
import { useSession } from '../features/session/api/get-session.ts';
import { SheetChromeProvider } from '../ui/sheet-chrome.tsx';
import { navOf } from './nav.ts';

/** Pages that are open to everybody. Whoever is signed in keeps the way to the others. */
export function OpenLayout() {
  const { data } = useSession();
  const { pathname } = useLocation();
  const other =
    pathname === '/sign-in' ? { to: '/sign-up', label: 'Open a shop' } : { to: '/sign-in', label: 'Sign in' };
  const account = data?.user ? (
    data.user.name
  ) : (
    <Link to={other.to} className="underline underline-offset-4">
      {other.label}
    </Link>
  );
  return (
    <SheetChromeProvider
      value={{ nav: data?.user ? navOf(data.user.role) : [], account, shopName: data?.shop?.name ?? '' }}
    >
      <Outlet />
    </SheetChromeProvider>
  );
}
