import type { ReactNode } from 'react';
import { classNames } from './class-names.ts';

interface TitleCellProps {
  readonly label: string;
  /** What the cell says; large when it names the page. */
  readonly children: ReactNode;
  /** A second line, in the same size as other cells. */
  readonly detail?: ReactNode;
  /** True for the cell that names the page. */
  readonly main?: boolean;
  /** Share of the width, against 1 for a usual cell. */
  readonly wide?: boolean;
}

/** Long names are cut to two lines, so that the block leaves room for the page; on hover they are whole. */
const inFull = (content: ReactNode): string | undefined => (typeof content === 'string' ? content : undefined);

/** One ruled cell of a title block. */
export function TitleCell({ label, children, detail, main = false, wide = main }: TitleCellProps) {
  return (
    <div
      className={classNames(
        'min-w-32 border-r border-b border-ink px-2.5 py-1.5 last:border-r-0 roomy:border-b-0',
        wide ? 'flex-[2]' : 'flex-1',
      )}
    >
      <dt className="text-11 text-pencil">{label}</dt>
      <dd
        title={inFull(children)}
        className={classNames(
          'line-clamp-2 wrap-anywhere print:line-clamp-none',
          main ? 'text-16 font-bold' : 'text-13',
        )}
      >
        {children}
      </dd>
      {detail !== undefined && (
        <dd title={inFull(detail)} className="line-clamp-2 text-13 wrap-anywhere print:line-clamp-none">
          {detail}
        </dd>
      )}
    </div>
  );
}

interface TitleBlockProps {
  /** TitleCells. */
  readonly children: ReactNode;
  /** The page's one main action: a main Button, or words that say why there is none. */
  readonly action?: ReactNode;
  /** Under the action, small: what comes next. */
  readonly actionNote?: ReactNode;
}

/** Along the bottom edge of each sheet: says where one is, and holds the page's one main action. */
export function TitleBlock({ children, action, actionNote }: TitleBlockProps) {
  return (
    <footer
      aria-label="Title block"
      className="flex shrink-0 flex-wrap border-t border-ink break-inside-avoid lg:flex-nowrap"
    >
      <dl className="flex w-full min-w-0 flex-1 basis-full flex-wrap roomy:flex-nowrap lg:min-h-20 lg:basis-0">
        {children}
      </dl>
      {(action !== undefined || actionNote !== undefined) && (
        <div className="flex w-full flex-col gap-1 border-ink p-2.5 max-lg:roomy:border-t lg:w-auto lg:max-w-72 lg:min-w-56 lg:border-l print:hidden">
          {action}
          {actionNote !== undefined && <p className="text-center text-11 text-pencil">{actionNote}</p>}
        </div>
      )}
    </footer>
  );
}
