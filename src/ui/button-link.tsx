import type { ReactNode } from 'react';
import { Link } from 'react-router';
import { buttonLook, type ButtonKind } from './button-look.ts';

interface ButtonLinkProps {
  /** A page of the product, or with `download` an address of the server. */
  readonly to: string;
  readonly kind?: ButtonKind;
  readonly wide?: boolean;
  /** True for files: the browser saves what the server answers. */
  readonly download?: boolean;
  /** Opens beside this page, such as a PDF. */
  readonly newTab?: boolean;
  readonly describedBy?: string;
  /** For screen readers, where the text alone does not say of what. */
  readonly label?: string;
  readonly children: ReactNode;
}

/** A link that looks like a button. */
export function ButtonLink({
  to,
  kind = 'plain',
  wide = false,
  download = false,
  newTab = false,
  describedBy,
  label,
  children,
}: ButtonLinkProps) {
  const look = buttonLook(kind, wide);
  if (download || newTab) {
    return (
      <a
        href={to}
        download={download || undefined}
        target={newTab ? '_blank' : undefined}
        rel={newTab ? 'noreferrer' : undefined}
        aria-describedby={describedBy}
        aria-label={label}
        className={look}
      >
        {children}
      </a>
    );
  }
  return (
    <Link to={to} aria-describedby={describedBy} aria-label={label} className={look}>
      {children}
    </Link>
  );
}
