import type { ReactNode } from 'react';
import { classNames } from './class-names.ts';
import { SheetHeader, type Crumb } from './sheet-header.tsx';
import { usePageFocus } from './use-page-focus.ts';

interface SheetProps {
  /** Name of the page: document title, and its first heading. */
  readonly title: string;
  /** Steps to the page, the page itself last (without `to`). Left out on top-level pages. */
  readonly crumbs?: readonly Crumb[];
  /** False where the title block alone shows the name; the heading then stays for screen readers only. */
  readonly showTitle?: boolean;
  /** Beside the heading. */
  readonly aside?: ReactNode;
  /** A TitleBlock. */
  readonly titleBlock?: ReactNode;
  /** True where the content rules its own sections and scrolls by itself: no padding, no scrolling here. */
  readonly bare?: boolean;
  readonly children: ReactNode;
}

/**
 * A page as a drawing sheet: double border, header, content, and the title block along the bottom edge,
 * which stays in view while the content scrolls. In print everything flows.
 */
export function Sheet({ title, crumbs = [], showTitle = true, aside, titleBlock, bare = false, children }: SheetProps) {
  const heading = usePageFocus();
  return (
    <div className="min-h-dvh bg-desk p-2 roomy:h-dvh print:h-auto print:min-h-0 print:bg-transparent print:p-0">
      <title>{`${title} · Stilepost`}</title>
      <a
        href="#content"
        className="absolute top-3 left-3 z-10 -translate-y-20 bg-ink px-4 py-2 text-paper focus:translate-y-0 print:hidden"
      >
        Skip to the content
      </a>
      <div className="flex h-full min-h-[calc(100dvh-1rem)] border border-ink bg-paper p-1 roomy:min-h-0 print:h-auto print:border-0 print:p-0">
        <div className="flex min-w-0 flex-1 flex-col border border-ink print:border-0">
          <SheetHeader crumbs={crumbs} />
          <main
            id="content"
            tabIndex={-1}
            className={classNames(
              'relative min-h-0 flex-1',
              bare ? 'flex flex-col' : 'overflow-y-auto px-4 py-6 roomy:px-6 print:overflow-visible print:p-0',
            )}
          >
            <div className={classNames(showTitle ? 'mb-4 flex flex-wrap items-baseline gap-x-6 gap-y-2' : 'sr-only')}>
              <h1 ref={heading} tabIndex={-1} className="text-22 font-bold wrap-anywhere">
                {title}
              </h1>
              {aside}
            </div>
            {children}
          </main>
          {titleBlock}
        </div>
      </div>
    </div>
  );
}
