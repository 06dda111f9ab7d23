import { randomUUID } from 'node:crypto';
import {
  DRAWER_LIMITS,
  type CutterChanged,
  type CutterList,
  type CuttersRead,
  type StoredCutter,
} from '#shared/contracts/cutters.ts';
import { draftsTouched } from '#shared/kernel/cutter-drawer/drafts-touched.ts';
import type { DrawerCutter, DrawerEntry } from '#shared/kernel/cutter-drawer/drawer-cutter.ts';
import { refsByNumbers } from '#shared/kernel/cutter-drawer/refs-by-numbers.ts';
import { writeCuttersCsv } from '#shared/kernel/cutter-drawer/write-cutters-csv.ts';
import { isUniqueViolation } from '../../db/unique-violation.ts';
import { AppError, notFound, wrongField } from '../../errors.ts';
import type { ComparedRow } from './compare-with-drawer.ts';
import type { CuttersStore } from './cutters.store.ts';

export type CuttersService = ReturnType<typeof cuttersService>;

const present = ({ id, unit, cutter, remarks }: DrawerCutter): StoredCutter => ({ id, unit, cutter, remarks });

async function withFreeName<T>(work: Promise<T>): Promise<T> {
  try {
    return await work;
  } catch (error) {
    if (isUniqueViolation(error)) {
      throw new AppError('name-taken', 'a cutter of the shop has that name', {
        message: 'Another cutter in the drawer has this name. Choose another.',
      });
    }
    throw error;
  }
}

/** A shop's cutter drawer. */
export function cuttersService(store: CuttersStore, now: () => Date) {
  type Draft = Awaited<ReturnType<CuttersStore['drafts']>>[number];

  /** What a change of `before` means for the shop's drafts. A draft uses a cutter when it carries the cutter's numbers. */
  function changed(all: readonly Draft[], before: DrawerCutter, after: DrawerCutter | null): CutterChanged {
    const drafts = all.map(({ particulars, ...draft }) => ({
      ...draft,
      frameName: particulars.name,
      cutterRefs: refsByNumbers(particulars, [before]),
    }));
    const touched = draftsTouched(before, after, drafts);
    return {
      cutter: after && present(after),
      changes: [...touched.changes],
      drafts: touched.drafts.map(({ frameId, roles }) => {
        const { frameName, jobName } = drafts.find((draft) => draft.frameId === frameId)!;
        return { frameId, frameName, jobName, roles: [...roles] };
      }),
    };
  }

  async function mustFind(shopId: string, id: string): Promise<DrawerCutter> {
    const found = await store.find(shopId, id);
    if (!found) throw notFound('cutter');
    return found;
  }

  async function mustHold(shopId: string, more: number): Promise<void> {
    const total = (await store.count(shopId)) + more;
    if (total > DRAWER_LIMITS.cutters)
      throw wrongField('cutters', `${total} in the drawer`, `at most ${DRAWER_LIMITS.cutters}`);
  }

  async function list(shopId: string): Promise<CutterList> {
    const cutters = (await store.list(shopId)).map(present);
    return { cutters: cutters.sort((a, b) => a.cutter.name.localeCompare(b.cutter.name, 'en', { numeric: true })) };
  }

  return {
    list,

    /** Puts cutters into the drawer, all or none. Throws 'name-taken', and 'invalid-input' for more than a drawer holds. */
    async add(shopId: string, entries: readonly DrawerEntry[]): Promise<StoredCutter[]> {
      await mustHold(shopId, entries.length);
      const added = entries.map((entry) => ({ id: randomUUID(), ...entry }));
      await withFreeName(store.add(shopId, added, now()));
      return added.map(present);
    },

    /** Puts in and changes what a file says, all or none. Throws as `add` and `change` do. */
    async take(shopId: string, rows: readonly ComparedRow[]): Promise<Pick<CuttersRead, 'added' | 'changed'>> {
      const fresh = rows.filter(({ is }) => is === 'new').map(({ entry }) => ({ id: randomUUID(), ...entry }));
      const pairs = rows.flatMap(({ is, before, entry }) =>
        is === 'changed' && before ? [{ before, after: { id: before.id, ...entry } }] : [],
      );
      await mustHold(shopId, fresh.length);
      const after = pairs.map((pair) => pair.after);
      if (!(await withFreeName(store.take(shopId, fresh, after, now())))) throw notFound('cutter');
      const drafts = await store.drafts(shopId);
      return {
        added: fresh.map(present),
        changed: pairs.map((pair) => ({
          before: present(pair.before),
          answer: changed(drafts, pair.before, pair.after),
        })),
      };
    },

    async change(shopId: string, id: string, entry: DrawerEntry): Promise<CutterChanged> {
      const before = await mustFind(shopId, id);
      if (!(await withFreeName(store.change(shopId, id, entry, now())))) throw notFound('cutter');
      return changed(await store.drafts(shopId), before, { id, ...entry });
    },

    async remove(shopId: string, id: string): Promise<CutterChanged> {
      const before = await mustFind(shopId, id);
      if (!(await store.remove(shopId, id))) throw notFound('cutter');
      return changed(await store.drafts(shopId), before, null);
    },

    async writeCsv(shopId: string): Promise<string> {
      return writeCuttersCsv((await list(shopId)).cutters);
    },
  };
}
