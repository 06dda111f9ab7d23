import type { ButtonHTMLAttributes, Ref } from 'react';
import { buttonLook, type ButtonKind } from './button-look.ts';

interface ButtonProps extends Omit<ButtonHTMLAttributes<HTMLButtonElement>, 'className'> {
  /** main: the page's one main action; plain: other actions; quiet: actions in a line of text or a table row. */
  readonly kind?: ButtonKind;
  /** What the button says while its work runs; it then takes no second click but keeps focus. '' when idle. */
  readonly busy?: string;
  readonly wide?: boolean;
  readonly ref?: Ref<HTMLButtonElement>;
}

export function Button({
  kind = 'plain',
  busy = '',
  wide = false,
  type = 'button',
  onClick,
  children,
  ...rest
}: ButtonProps) {
  const working = busy !== '';
  return (
    <button
      {...rest}
      type={working ? 'button' : type}
      aria-disabled={working || rest['aria-disabled']}
      onClick={working ? undefined : onClick}
      className={buttonLook(kind, wide)}
    >
      {working ? busy : children}
    </button>
  );
}
