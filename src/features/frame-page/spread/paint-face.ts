import { lineSetKey, type Face, type LineSet } from '#shared/kernel/line-sets/line-set.ts';
import type { DrawnFrame } from '#shared/kernel/worked-frame.ts';
import { frameMap, setupMap, type PageSize, type View } from '../model/view.ts';
import { labelsOf } from './labels.ts';
import { paintBoard } from './paint-board.ts';
import type { Painted } from './painted.ts';
import { paintPins } from './paint-pins.ts';
import { paintWords } from './paint-words.ts';
import { SET_LOOK } from './set-look.ts';
import { lineSetPath } from './shape-path.ts';

/** What decides how a page looks. */
export interface FacePicture {
  readonly worked: DrawnFrame;
  readonly view: View;
  readonly page: PageSize;
  /** Line sets that are switched off, by lineSetKey. */
  readonly hidden: ReadonlySet<string>;
}

/** Names of which every line set is switched off. */
function hiddenNames(lineSets: readonly LineSet[], hidden: ReadonlySet<string>): ReadonlySet<string> {
  const names = new Set<string>(lineSets.map((s) => s.set));
  for (const lineSet of lineSets) if (!hidden.has(lineSetKey(lineSet))) names.delete(lineSet.set);
  return names;
}

/** A page's board and lines, and what stands above them and above what is lit up: pins and words. */
export function paintFace(
  face: Face,
  { worked, view, page, hidden }: FacePicture,
): { readonly lines: readonly Painted[]; readonly marks: readonly Painted[] } {
  const work = worked[face];
  const { placement, lineSets } = work;
  const map = setupMap(view, placement, page);
  const lines: Painted[] = paintBoard(worked, face, frameMap(view, placement, page));
  for (const lineSet of lineSets) {
    const key = lineSetKey(lineSet);
    if (!hidden.has(key)) lines.push({ kind: 'path', key, d: lineSetPath(lineSet, map), look: SET_LOOK[lineSet.set] });
  }
  const words = paintWords(labelsOf(worked, face), view, placement, page, hiddenNames(lineSets, hidden));
  return { lines, marks: [...paintPins(work, view, page), ...words] };
}
