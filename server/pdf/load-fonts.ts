import { readFile } from 'node:fs/promises';
import { createRequire } from 'node:module';
import { decompress } from 'woff2-encoder';
import { readCmap } from './read-cmap.ts';

/** The part of JetBrains Mono for some scripts, in one weight. */
export interface SheetFont {
  /** As registered with the document, 'latin-400'. */
  readonly name: string;
  readonly bytes: Uint8Array;
  readonly has: ReadonlySet<number>;
}

export interface SheetFonts {
  readonly regular: readonly SheetFont[];
  readonly bold: readonly SheetFont[];
}

/** Latin first: what it has is taken from it. */
const SCRIPTS = ['latin', 'latin-ext', 'greek', 'cyrillic', 'cyrillic-ext', 'vietnamese'];

const resolve = createRequire(import.meta.url).resolve;

async function loadWeight(weight: 400 | 700): Promise<SheetFont[]> {
  const fonts: SheetFont[] = [];
  for (const script of SCRIPTS) {
    const file = resolve(`@fontsource/jetbrains-mono/files/jetbrains-mono-${script}-${weight}-normal.woff2`);
    // The PDF writer draws nothing from woff2 and says nothing, so it gets the font unpacked.
    const bytes = await decompress(await readFile(file));
    fonts.push({ name: `${script}-${weight}`, bytes, has: readCmap(bytes) });
  }
  return fonts;
}

let loading: Promise<SheetFonts> | undefined;

/** JetBrains Mono in two weights and all its scripts, unpacked once a process. */
export function loadFonts(): Promise<SheetFonts> {
  loading ??= (async () => ({ regular: await loadWeight(400), bold: await loadWeight(700) }))();
  return loading;
}
