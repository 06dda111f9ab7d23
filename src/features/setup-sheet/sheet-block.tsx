import { useMemo } from 'react';
import { sheetDrawingSvg } from '#shared/kernel/sheet/drawing-svg.ts';
import { pictureSvg } from '#shared/kernel/sheet/picture-svg.ts';
import { SHEET_COLOURS } from '#shared/kernel/sheet/sheet-colours.ts';
import type { SheetDrawing } from '#shared/kernel/sheet/sheet-drawing.ts';
import type { SheetBlock as Block, SheetLine, SignOffBox } from '#shared/kernel/sheet/sheet-model.ts';
import { SvgPicture } from '../../ui/svg-picture.tsx';
import { SheetTable } from './sheet-table.tsx';

/** CSS pixels for a millimetre of the sheet's paper: its smallest figures then stand 15 px high, to be read at arm's length. */
const PIXELS_PER_MM = 6;
/** Share of the window's height that a drawing may take, so that it is seen whole above the title block. */
const SHARE_OF_HEIGHT = 0.75;
/** Room in millimetres of paper that any drawing needs with its figures. */
const LEAST_ROOM = { width: 70, height: 60 };

function Drawing({ drawing, width }: { readonly drawing: SheetDrawing; readonly width: number }) {
  const across = Math.max(LEAST_ROOM.width, Math.round(width / PIXELS_PER_MM));
  const up = Math.max(LEAST_ROOM.height, Math.round((window.innerHeight * SHARE_OF_HEIGHT) / PIXELS_PER_MM));
  const svg = useMemo(() => sheetDrawingSvg(drawing, { width: across, height: up }), [drawing, across, up]);
  return <SvgPicture svg={svg} />;
}

function Pictures({ pictures }: Pick<Extract<Block, { kind: 'pictures' }>, 'pictures'>) {
  return (
    <div className="flex flex-wrap gap-x-8 gap-y-6">
      {pictures.map(({ caption, picture }, i) => (
        <figure key={i} className="max-w-full" style={{ width: picture.width * PIXELS_PER_MM }}>
          <SvgPicture svg={pictureSvg(picture)} />
          {caption !== '' && <figcaption className="mt-1">{caption}</figcaption>}
        </figure>
      ))}
    </div>
  );
}

function Line({ line: { text, word, colour } }: { readonly line: SheetLine }) {
  return (
    <>
      {word !== undefined && (
        <strong className="font-bold" style={{ color: colour && SHEET_COLOURS[colour] }}>
          {word}
          {/[.:]$/.test(word) ? ' ' : ': '}
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
      return <Pictures pictures={block.pictures} />;
    case 'table':
      return (
        <>
          <SheetTable title={block.title} table={block.table} width={width} />
          {block.after.map((text, i) => (
            <p key={i} className="mt-2">
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

/** One part of a page of the setup sheet, in large type. Drawings under the page's own heading have no title. */
export function SheetBlock({ block, width }: SheetBlockProps) {
  const id = `block-${block.id}`;
  return (
    <section aria-labelledby={block.title === '' ? undefined : id} className="mb-8">
      {block.title !== '' && (
        <h3 id={id} className="mb-2 border-b border-rule pb-1 text-16 font-bold">
          {block.title}
        </h3>
      )}
      <Content block={block} width={width} />
    </section>
  );
}
