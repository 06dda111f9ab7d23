import { useLayoutEffect, type RefObject } from 'react';
import type { Face } from '#shared/kernel/line-sets/line-set.ts';
import { useDesk } from '../model/desk.ts';
import { paintFace, type FacePicture } from './paint-face.ts';
import { showIn } from './show-painted.ts';

/**
 * Keeps a page's lines and words as the desk has them now. Past React: with each keystroke both faces change and nothing
 * else of the page does, and working out which elements those are would take longer than changing them.
 */
export function usePaintedFace(
  face: Face,
  lines: RefObject<SVGGElement | null>,
  marks: RefObject<SVGGElement | null>,
): void {
  const desk = useDesk();
  useLayoutEffect(() => {
    const showLines = showIn(lines.current!);
    const showMarks = showIn(marks.current!);
    let last: FacePicture | null = null;
    function paint(): void {
      const now: FacePicture = {
        worked: desk.editor.store.get().drawn,
        view: desk.shown.get(),
        page: desk.page.get(),
        hidden: desk.hidden.get(),
      };
      if (last?.worked === now.worked && last.view === now.view && last.page === now.page && last.hidden === now.hidden)
        return;
      last = now;
      const painted = paintFace(face, now);
      showLines(painted.lines);
      showMarks(painted.marks);
    }
    paint();
    const stops = [desk.editor.store, desk.shown, desk.page, desk.hidden].map((store) => store.subscribe(paint));
    return () => stops.forEach((stop) => stop());
  }, [desk, face, lines, marks]);
}
