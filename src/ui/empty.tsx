import type { ReactNode } from 'react';

interface EmptyProps {
  /** What is not there yet. */
  readonly title: string;
  /** What to do first. */
  readonly children: ReactNode;
  readonly actions?: ReactNode;
}

/** In place of an empty list: says what to do first, and offers it. */
export function Empty({ title, children, actions }: EmptyProps) {
  return (
    <div className="max-w-2xl border border-dashed border-pencil px-6 py-5">
      <p className="mb-1 font-bold">{title}</p>
      <div className="mb-3">{children}</div>
      {actions !== undefined && <div className="flex flex-wrap gap-3">{actions}</div>}
    </div>
  );
}
