import { classNames } from './class-names.ts';

export type ButtonKind = 'main' | 'plain' | 'quiet';

const LOOKS: Record<ButtonKind, string> = {
  main: 'min-h-9 border border-ink bg-ink px-4 py-1.5 font-bold text-paper hover:bg-paper hover:text-ink',
  plain: 'min-h-8 border border-ink px-3 py-1 hover:bg-ink hover:text-paper',
  quiet: 'min-h-6 whitespace-nowrap underline decoration-pencil underline-offset-4 hover:decoration-2',
};

/** Class names of buttons and of links that act like one. */
export const buttonLook = (kind: ButtonKind, wide = false): string =>
  classNames(
    'inline-flex items-center justify-center text-center text-13 disabled:opacity-60 aria-disabled:opacity-60 print:hidden',
    LOOKS[kind],
    wide && 'w-full',
  );
