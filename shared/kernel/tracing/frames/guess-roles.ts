import { findParents } from './find-parents.ts';
import type { GuessedRole, RoleLoop, RoleNote } from './loop-role.ts';

/**
 * Loops that stand for no part of a frame although they are closed. Where cells hang together: when some lie wholly inside their
 * outline, that is the perimeter of a frame drawn as stiles and rails, and the cells along it are members; when none does, the
 * cells themselves count and the outline is only the line round them.
 */
function setAside(loops: readonly RoleLoop[], parents: Int32Array): Map<number, RoleNote> {
  const aside = new Map<number, RoleNote>();
  const cellsOf = new Map<number, number[]>();
  loops.forEach(({ kind }, i) => {
    const parent = parents[i]!;
    if (kind !== 'cell' || parent < 0 || loops[parent]!.kind !== 'outline') return;
    const cells = cellsOf.get(parent);
    if (cells) cells.push(i);
    else cellsOf.set(parent, [i]);
  });
  for (const [outline, cells] of cellsOf) {
    const edge = new Set(loops[outline]!.segments);
    const along = cells.filter((i) => loops[i]!.segments?.some((s) => edge.has(s)));
    if (along.length < cells.length) for (const i of along) aside.set(i, 'touches-the-outline');
    else aside.set(outline, 'only-round-cells');
  }
  return aside;
}

/**
 * A role for each loop from how they lie in each other: outermost loops are perimeters, loops in them openings, loops in those
 * are left out with a note. No loop is taken for a dado: a drawing does not say so.
 */
export function guessRoles(loops: readonly RoleLoop[]): GuessedRole[] {
  const aside = setAside(loops, findParents(loops.map(({ contour }) => contour)));
  const counted = loops.flatMap((_, i) => (aside.has(i) ? [] : [i]));
  const parents = findParents(counted.map((i) => loops[i]!.contour));
  const depths = new Map<number, number>();
  const depthOf = (at: number): number => {
    const known = depths.get(at);
    if (known !== undefined) return known;
    const depth = parents[at]! < 0 ? 0 : depthOf(parents[at]!) + 1;
    depths.set(at, depth);
    return depth;
  };
  const roles: GuessedRole[] = loops.map((_, i) => ({ role: 'leave-out', note: aside.get(i) ?? null }));
  counted.forEach((i, at) => {
    const depth = depthOf(at);
    roles[i] =
      depth === 0
        ? { role: 'perimeter', note: null }
        : depth === 1
          ? { role: 'opening', note: null }
          : { role: 'leave-out', note: 'inside-an-opening' };
  });
  return roles;
}
