import { execFileSync } from 'node:child_process';
import { mkdtempSync, readFileSync, rmSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';

/** Runs one of the poppler tools on a PDF; `args` gets the file's path and a folder to write into. Fails when the tool is not installed. */
function poppler<T>(
  tool: string,
  pdf: Uint8Array,
  args: (file: string, folder: string) => string[],
  read: (output: string, folder: string) => T,
): T {
  const folder = mkdtempSync(join(tmpdir(), 'read-pdf-'));
  try {
    const file = join(folder, 'sheet.pdf');
    writeFileSync(file, pdf);
    const output = execFileSync(tool, args(file, folder), { encoding: 'utf8', maxBuffer: 64 * 1024 * 1024 });
    return read(output, folder);
  } finally {
    rmSync(folder, { recursive: true });
  }
}

/** What pdfinfo says, by name: Pages, Page size, Title, CreationDate … */
export const pdfFacts = (pdf: Uint8Array): Record<string, string> =>
  poppler(
    'pdfinfo',
    pdf,
    (file) => ['-isodates', file],
    (output) =>
      Object.fromEntries(
        output
          .split('\n')
          .filter((l) => l.includes(':'))
          .map((l) => [l.slice(0, l.indexOf(':')), l.slice(l.indexOf(':') + 1).trim()]),
      ),
  );

/** The text of each page, in reading order. */
export const pdfPages = (pdf: Uint8Array): string[] =>
  poppler(
    'pdftotext',
    pdf,
    (file) => [file, '-'],
    (output) => output.split('\f').slice(0, -1),
  );

/** White space made single, for looking up sentences that are broken into lines. */
export const inOneLine = (text: string): string => text.replace(/\s+/g, ' ');

/** Name and whether embedded of each font. */
export const pdfFonts = (pdf: Uint8Array): { name: string; embedded: boolean }[] =>
  poppler(
    'pdffonts',
    pdf,
    (file) => [file],
    (output) =>
      output
        .trim()
        .split('\n')
        .slice(2)
        .map((line) => ({
          name: line.split(/\s+/)[0]!,
          embedded: /\s(yes|no)\s+(yes|no)\s+(yes|no)\s+\d/.exec(line)?.[1] === 'yes',
        })),
  );

/** A printed word's box, in millimetres from the page's upper left corner. */
export interface Word {
  readonly text: string;
  readonly left: number;
  readonly right: number;
  readonly top: number;
  readonly bottom: number;
}

const MM = 25.4 / 72;

/** Words of each page with the boxes that the reader gives them (line height, not ink). */
export const pdfWords = (pdf: Uint8Array): Word[][] =>
  poppler(
    'pdftotext',
    pdf,
    (file) => ['-bbox', file, '-'],
    (output) =>
      output
        .split('<page ')
        .slice(1)
        .map((page) =>
          [
            ...page.matchAll(
              /<word xMin="([\d.-]+)" yMin="([\d.-]+)" xMax="([\d.-]+)" yMax="([\d.-]+)">(.*?)<\/word>/g,
            ),
          ].map(([, x1, y1, x2, y2, text]): Word => ({
            text: text!,
            left: Number(x1) * MM,
            right: Number(x2) * MM,
            top: Number(y1) * MM,
            bottom: Number(y2) * MM,
          })),
        ),
  );

/** One page as pixels. */
export interface Pixels {
  readonly width: number;
  readonly height: number;
  readonly dotsPerMm: number;
  /** Red, green, blue. */
  readonly at: (x: number, y: number) => readonly [number, number, number];
}

/** A page (from 1) drawn by pdftoppm. */
export const pdfPixels = (pdf: Uint8Array, page: number, dotsPerInch: number): Pixels =>
  poppler(
    'pdftoppm',
    pdf,
    (file, folder) => [
      '-r',
      String(dotsPerInch),
      '-f',
      String(page),
      '-l',
      String(page),
      '-singlefile',
      file,
      join(folder, 'page'),
    ],
    (_, folder) => {
      const ppm = readFileSync(join(folder, 'page.ppm'));
      const head = /^P6\s+(\d+)\s+(\d+)\s+255\s/.exec(ppm.subarray(0, 40).toString('latin1'))!;
      const [width, height, start] = [Number(head[1]), Number(head[2]), head[0].length];
      return {
        width,
        height,
        dotsPerMm: dotsPerInch / 25.4,
        at: (x, y) => {
          const i = start + 3 * (y * width + x);
          return [ppm[i]!, ppm[i + 1]!, ppm[i + 2]!];
        },
      };
    },
  );

/** How many pixels of a region (millimetres) satisfy a test. */
export function countPixels(
  page: Pixels,
  region: { left: number; top: number; right: number; bottom: number },
  holds: (rgb: readonly [number, number, number]) => boolean,
): number {
  let count = 0;
  const dot = (mm: number) => Math.round(mm * page.dotsPerMm);
  for (let y = dot(region.top); y < dot(region.bottom); y++)
    for (let x = dot(region.left); x < dot(region.right); x++) if (holds(page.at(x, y))) count += 1;
  return count;
}
