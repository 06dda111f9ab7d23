import { Link } from 'react-router';
import { SHEET_COLOURS } from '#shared/kernel/sheet/sheet-colours.ts';
import type { SheetModel, SheetPage } from '#shared/kernel/sheet/sheet-model.ts';
import { Cautions } from '../../ui/cautions.tsx';
import { classNames } from '../../ui/class-names.ts';
import { SheetBlock } from './sheet-block.tsx';
import { useWidth } from './use-width.ts';

/** A tablet on its side, for the moment before the page is laid out. */
const WIDTH_BEFORE = 960;

/** Short, so that each stays on one line of a tablet. */
const STEP_WORDS: Record<SheetPage['id'], string> = {
  back: 'Back',
  turn: 'Turn over',
  front: 'Front',
  section: 'Edge',
  cutters: 'Cutters',
};

interface SheetPagesProps {
  readonly model: SheetModel;
  readonly shown: SheetPage['id'];
  /** Address of a page of this sheet. */
  readonly addressOf: (id: SheetPage['id']) => string;
}

/** Links big enough for gloves. */
function Steps({ model, shown, addressOf }: SheetPagesProps) {
  return (
    <nav
      aria-label="Pages of the setup sheet"
      className="mb-4 grid grid-cols-2 border border-ink sm:grid-cols-4 print:hidden"
    >
      {model.pages.map((page, i) => (
        <Link
          key={page.id}
          to={addressOf(page.id)}
          aria-current={page.id === shown ? 'step' : undefined}
          className="flex min-h-12 items-center justify-center border-ink px-2 py-1 text-center text-13 font-bold outline-offset-[-4px] aria-[current]:bg-ink aria-[current]:text-paper max-sm:even:border-l max-sm:nth-[n+3]:border-t sm:not-first:border-l"
        >
          {i + 1} {STEP_WORDS[page.id]}
        </Link>
      ))}
    </nav>
  );
}

/** The setup sheet page by page on screen, and whole on paper. */
export function SheetPages(props: SheetPagesProps) {
  const { model, shown, addressOf } = props;
  const { ref, width } = useWidth<HTMLDivElement>(WIDTH_BEFORE);
  const next = model.pages[model.pages.findIndex((page) => page.id === shown) + 1];
  return (
    <div ref={ref} className="text-16">
      <Steps {...props} />
      {model.pages.map((page) => (
        <article
          key={page.id}
          aria-labelledby={`page-${page.id}`}
          className={classNames('break-after-page', page.id !== shown && 'hidden print:block')}
        >
          <h2 id={`page-${page.id}`} className="text-22 font-bold" style={{ color: SHEET_COLOURS[page.colour] }}>
            {page.title}
          </h2>
          <p className="mb-5 max-w-4xl">{page.lead}</p>
          {page.blocks.map((block) => (
            <SheetBlock key={block.id} block={block} width={width} />
          ))}
        </article>
      ))}
      <div className="print:hidden">
        {next && (
          <Link
            to={addressOf(next.id)}
            className="mb-6 flex min-h-14 items-center justify-center border border-ink bg-ink px-4 py-2 text-center font-bold text-paper"
          >
            Next: {next.title}
          </Link>
        )}
        {shown !== 'cutters' && <Cautions />}
      </div>
    </div>
  );
}
