import type { ReactNode } from 'react';

interface ProgressTextProps {
  /** What is going on, with numbers where there are any: "Reading 3 of 12 files". */
  readonly children: ReactNode;
  /** How much is done, from 0 to 1; left out when nobody knows. */
  readonly done?: number;
  /** A quiet Button that cancels. */
  readonly cancel?: ReactNode;
}

/** A plain ink bar in a hairline box: browsers draw their own in colours that mean something else on a sheet. */
const BAR =
  'h-2 w-40 appearance-none border border-ink bg-paper [&::-webkit-progress-bar]:bg-paper [&::-webkit-progress-value]:bg-ink [&::-moz-progress-bar]:bg-ink';

/** Says in words that work is under way. */
export function ProgressText({ children, done, cancel }: ProgressTextProps) {
  return (
    <div role="status" className="flex flex-wrap items-center gap-x-4 gap-y-1 text-pencil">
      <span>{children}</span>
      {done !== undefined && <progress aria-label="Done so far" max={1} value={done} className={BAR} />}
      {cancel}
    </div>
  );
}
