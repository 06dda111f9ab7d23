import { useMemo } from 'react';
import { sheetDrawingSvg } from '#shared/kernel/sheet/drawing-svg.ts';
import { pictureSvg } from '#shared/kernel/sheet/picture-svg.ts';
import { SHEET_COLOURS } from '#shared/kernel/sheet/sheet-colours.ts';
import type { SheetDrawing } from '#shared/kernel/sheet/sheet-drawing.ts';
import type { SheetBlock as Block, SheetLine, SignOffBox } from '#shared/kernel/sheet/sheet-model.ts';
import { SheetSvg } from './sheet-svg.tsx';
import { SheetTable } from './sheet-table.tsx';

/** CSS pixels for a millimetre of the drawing's paper: its 2.4 mm figures then stand 17 px high, to be read at arm's length. */
const PIXELS_PER_MM = 7;
/** A drawing higher than this would not be seen whole on a tablet. */
const MOST_HEIGHT_MM = 100;
const LEAST_WIDTH_MM = 70;

function Drawing({ drawing, width }: { readonly drawing: SheetDrawing; readonly width: number }) {
  const room = Math.max(LEAST_WIDTH_MM, Math.round(width / PIXELS_PER_MM));
  const svg = useMemo(() => sheetDrawingSvg(drawing, { width: room, height: MOST_HEIGHT_MM }), [drawing, room]);
  return <SheetSvg svg={svg} />;
}

function Line({ line: { text, word, colour } }: { readonly line: SheetLine }) {
  return (
    <>
      {word !== undefined && (
        <strong className="font-bold" style={{ color: colour && SHEET_COLOURS[colour] }}>
          {word}:{' '}
        </strong>
      )}
      {text}
    </>
  );
}

function SignOff({ boxes }: { readonly boxes: readonly SignOffBox[] }) {
  return (
    <ul className="grid gap-3 sm:grid-cols-3">
      {boxes.map((box) => (
        <li key={box.what} className="border border-ink p-3">
          <span className="block text-12 text-pencil">{box.what}</span>
          <span className="block min-h-6">{box.name}</span>
          <span className="block min-h-6">{box.date}</span>
        </li>
      ))}
    </ul>
  );
}

interface SheetBlockProps {
  readonly block: Block;
  /** CSS pixels that the block has across. */
  readonly width: number;
}

function Content({ block, width }: SheetBlockProps) {
  switch (block.kind) {
    case 'drawing':
      return <Drawing drawing={block.drawing} width={width} />;
    case 'pictures':
      return (
        <div className="grid gap-6 md:grid-cols-2">
          {block.pictures.map(({ caption, picture }) => (
            <figure key={caption}>
              <SheetSvg svg={pictureSvg(picture)} className="max-w-xl" />
              <figcaption className="mt-1">{caption}</figcaption>
            </figure>
          ))}
        </div>
      );
    case 'table':
      return (
        <>
          <SheetTable title={block.title} table={block.table} width={width} />
          {block.after.map((text) => (
            <p key={text} className="mt-2">
              {text}
            </p>
          ))}
        </>
      );
    case 'list': {
      const List = block.ordered ? 'ol' : 'ul';
      return (
        <List className={block.ordered ? 'list-decimal space-y-2 pl-8' : 'list-disc space-y-2 pl-6'}>
          {block.items.map((line, i) => (
            <li key={i} className="pl-1 wrap-anywhere">
              <Line line={line} />
            </li>
          ))}
        </List>
      );
    }
    case 'sign-off':
      return <SignOff boxes={block.boxes} />;
  }
}

/** One part of a page of the setup sheet, in large type. */
export function SheetBlock({ block, width }: SheetBlockProps) {
  return (
    <section aria-labelledby={`block-${block.id}`} className="mb-8">
      <h3 id={`block-${block.id}`} className="mb-2 border-b border-rule pb-1 text-16 font-bold">
        {block.title}
      </h3>
      <Content block={block} width={width} />
    </section>
  );
}
