import { classNames } from './class-names.ts';

/** Class names of anything one types or picks in: white, ruled below, the rule in the stop colour while wrong. */
export const entryLook = (...more: (string | false)[]): string =>
  classNames(
    'min-h-6 border-b border-ink bg-entry px-1.5 py-0.5 text-13 text-ink aria-invalid:border-b-2 aria-invalid:border-stop',
    'disabled:bg-transparent disabled:text-pencil [&[readonly]]:bg-transparent',
    ...more,
  );
