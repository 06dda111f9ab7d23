import { CHARACTER_WIDTH } from '#shared/kernel/sheet/paper-picture.ts';
import { SHEET_COLOURS, type SheetColour } from '#shared/kernel/sheet/sheet-colours.ts';
import { countCharacters } from '#shared/kernel/sheet/wrap-text.ts';
import type { SheetFont, SheetFonts } from './load-fonts.ts';
import { DRAWN_SIGNS } from './printable-text.ts';

/** What draws on the current page. All lengths in millimetres of paper, Y down from the upper edge. */
export interface Pen {
  readonly doc: PDFKit.PDFDocument;
  readonly fonts: SheetFonts;
}

export interface TextLook {
  readonly size: number;
  readonly colour: SheetColour;
  readonly bold?: boolean;
  readonly anchor?: 'start' | 'middle' | 'end';
  readonly turned?: boolean;
}

export const textWidth = (text: string, size: number): number => countCharacters(text) * CHARACTER_WIDTH * size;

/** Text in one line with its baseline at y. Characters without a glyph must have been replaced before: they throw. */
export function drawText({ doc, fonts }: Pen, text: string, x: number, y: number, look: TextLook): void {
  const { size, anchor = 'start', turned = false } = look;
  const width = textWidth(text, size);
  const start = x - (anchor === 'start' ? 0 : anchor === 'middle' ? width / 2 : width);
  const family = look.bold ? fonts.bold : fonts.regular;
  if (turned) doc.save().rotate(-90, { origin: [x, y] });
  doc.fillColor(SHEET_COLOURS[look.colour]);
  let at = start;
  for (const run of fontRuns(text, family)) {
    doc.font(run.font.name).fontSize(size);
    if (DRAWN_SIGNS.has(run.text)) drawAlmostEqual(doc, at, y, size);
    else drawRun(doc, run.text, at, y);
    at += textWidth(run.text, size);
  }
  if (turned) doc.restore();
}

// Ligatures and contextual forms would change the width of what is meant as figures.
const PLAIN = {
  lineBreak: false,
  baseline: 'alphabetic',
  features: { calt: false, liga: false } as unknown as PDFKit.Mixins.OpenTypeFeatures[],
} as const;

const drawRun = (doc: PDFKit.PDFDocument, text: string, x: number, y: number): void => {
  doc.text(text, x, y, { ...PLAIN, features: PLAIN.features });
};

/** "≈", which JetBrains Mono's subsets lack: two tildes one above the other, read out and copied as the one sign it is. */
function drawAlmostEqual(doc: PDFKit.PDFDocument, x: number, y: number, size: number): void {
  readAs(doc, '≈', () => drawRun(doc, '~', x, y - 0.11 * size));
  readAs(doc, '', () => drawRun(doc, '~', x, y + 0.11 * size));
}

/**
 * What `draw` writes is read out and copied as `text` (ActualText, ISO 32000-1, 14.9.4). Readers place such text by the
 * coordinates in force where the mark ends, and pdfkit turns those over around each word: so the mark has to stand inside,
 * next to the text object itself.
 */
function readAs(doc: PDFKit.PDFDocument, text: string, draw: () => void): void {
  const utf16 = [...text].map((c) => c.charCodeAt(0).toString(16).padStart(4, '0')).join('');
  const add = doc.addContent.bind(doc);
  doc.addContent = (data: string) => {
    if (data === 'BT') add(`/Span <</ActualText <feff${utf16}>>> BDC`);
    add(data);
    if (data === 'ET') add('EMC');
    return doc;
  };
  try {
    draw();
  } finally {
    doc.addContent = add;
  }
}

interface Run {
  text: string;
  readonly font: SheetFont;
}

/** Stretches of text that one font can draw; a drawn sign is a stretch of its own. */
function fontRuns(text: string, family: readonly SheetFont[]): Run[] {
  const runs: Run[] = [];
  for (const character of text) {
    const drawn = DRAWN_SIGNS.has(character);
    const font = drawn ? family[0] : family.find((f) => f.has.has(character.codePointAt(0)!));
    if (!font) throw new Error(`no glyph for ${JSON.stringify(character)}`);
    const last = runs[runs.length - 1];
    if (last && last.font === font && !drawn && !DRAWN_SIGNS.has(last.text)) last.text += character;
    else runs.push({ text: character, font });
  }
  return runs;
}
