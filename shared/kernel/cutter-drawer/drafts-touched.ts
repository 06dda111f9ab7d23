import type { Cutter, CutterRole } from '../cutters/cutter.ts';
import type { CutterRefs, DrawerEntry, DrawerCutter } from './drawer-cutter.ts';

export interface TouchedDraft {
  readonly frameId: string;
  /** The work for which the frame refers to the cutter. */
  readonly roles: readonly CutterRole[];
}

export interface DraftsTouched {
  /** Entries of the cutter that changed, 'unit' among them; ['removed'] for one taken out of the drawer. None when only remarks did. */
  readonly changes: readonly string[];
  /** Drafts whose copy of the cutter is now another one; none when nothing that is copied changed. */
  readonly drafts: readonly TouchedDraft[];
}

function changedEntries(before: DrawerEntry, after: DrawerEntry): string[] {
  const [was, is] = [before.cutter, after.cutter] as [Cutter, Cutter];
  const keys = new Set([...Object.keys(was), ...Object.keys(is)]) as Set<keyof Cutter>;
  const changed = [...keys].filter((key) => !Object.is(was[key], is[key]));
  return before.unit === after.unit ? changed : ['unit', ...changed];
}

/**
 * The drafts that a change of a drawer's cutter touches: those that refer to it, in the order given. `after` is null
 * when it was taken out. Released revisions keep their own copy and are never touched. Throws when the two are not one cutter.
 */
export function draftsTouched(
  before: DrawerCutter,
  after: DrawerCutter | null,
  drafts: readonly { readonly frameId: string; readonly cutterRefs: CutterRefs }[],
): DraftsTouched {
  if (after && after.id !== before.id)
    throw new RangeError(`cutter: got ${after.id} after ${before.id}, takes the same one`);
  const changes = after ? changedEntries(before, after) : ['removed'];
  if (changes.length === 0) return { changes, drafts: [] };
  const touched = drafts.flatMap(({ frameId, cutterRefs }): TouchedDraft[] => {
    const roles = (Object.keys(cutterRefs) as CutterRole[]).filter((role) => cutterRefs[role] === before.id);
    return roles.length > 0 ? [{ frameId, roles }] : [];
  });
  return { changes, drafts: touched };
}
