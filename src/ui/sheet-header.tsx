import { Fragment } from 'react';
import { Link, NavLink } from 'react-router';
import { useSheetChrome } from './sheet-chrome.tsx';

export interface Crumb {
  readonly label: string;
  readonly to?: string;
}

/** Name of the product, where one can go, and the steps to this page. */
export function SheetHeader({ crumbs }: { readonly crumbs: readonly Crumb[] }) {
  const { nav, account } = useSheetChrome();
  return (
    <header className="flex min-h-11 flex-wrap items-stretch gap-x-6 border-b border-ink px-4 print:hidden">
      <Link to="/" className="flex items-center text-16 font-bold">
        Stilepost
      </Link>
      {nav.length > 0 && (
        <nav aria-label="Main" className="flex flex-wrap gap-x-6">
          {nav.map((entry) => (
            <NavLink
              key={entry.to}
              to={entry.to}
              className="flex min-h-11 items-center border-y-3 border-transparent hover:border-b-rule aria-[current=page]:border-b-back"
            >
              {entry.label}
            </NavLink>
          ))}
        </nav>
      )}
      <div className="flex min-h-11 min-w-0 flex-1 basis-96 items-center justify-end gap-x-6 py-1">
        {crumbs.length > 0 && (
          <nav aria-label="Where you are" className="flex min-w-0 gap-x-[1ch]">
            {crumbs.map((crumb, i) => (
              <Fragment key={i}>
                {i > 0 && <span aria-hidden="true">/</span>}
                {crumb.to ? (
                  <Link
                    to={crumb.to}
                    title={crumb.label}
                    className="min-w-0 truncate underline decoration-rule underline-offset-4 hover:decoration-ink"
                  >
                    {crumb.label}
                  </Link>
                ) : (
                  <span aria-current="page" title={crumb.label} className="min-w-0 truncate">
                    {crumb.label}
                  </span>
                )}
              </Fragment>
            ))}
          </nav>
        )}
        {account}
      </div>
    </header>
  );
}
