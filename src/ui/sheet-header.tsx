import { Fragment } from 'react';
import { Link, NavLink } from 'react-router';
import { classNames } from './class-names.ts';
import { useSheetChrome } from './sheet-chrome.tsx';

export interface Crumb {
  readonly label: string;
  readonly to?: string;
}

/** Labels up to this long stand whole: cut, too little of them is left to be read. */
const SHORT = 10;
const crumbLook = ({ label }: Crumb): string => (label.length <= SHORT ? 'shrink-0' : 'min-w-0 truncate');

/** Name of the product, where one can go, and the steps to this page. */
export function SheetHeader({ crumbs }: { readonly crumbs: readonly Crumb[] }) {
  const { nav, account } = useSheetChrome();
  return (
    <header className="flex min-h-11 flex-wrap items-stretch gap-x-5 border-b border-ink px-4 print:hidden">
      <Link to="/" className="flex items-center text-16 font-bold">
        Stilepost
      </Link>
      {nav.length > 0 && (
        <nav aria-label="Main" className="flex flex-wrap gap-x-5">
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
      <div className="flex min-h-11 min-w-0 flex-1 basis-96 items-center justify-end gap-x-5 py-1">
        {crumbs.length > 0 && (
          <nav aria-label="Where you are" className="flex min-w-0 gap-x-[1ch]">
            {crumbs.map((crumb, i) => (
              <Fragment key={i}>
                {i > 0 && <span aria-hidden="true">/</span>}
                {crumb.to ? (
                  <Link
                    to={crumb.to}
                    title={crumb.label}
                    className={classNames(
                      crumbLook(crumb),
                      'underline decoration-rule underline-offset-4 hover:decoration-ink',
                    )}
                  >
                    {crumb.label}
                  </Link>
                ) : (
                  <span aria-current="page" title={crumb.label} className={crumbLook(crumb)}>
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
