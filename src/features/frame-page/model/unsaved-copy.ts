import { z } from 'zod';
import { particulars } from '#shared/contracts/particulars.ts';
import type { Particulars } from '#shared/kernel/particulars/particulars.ts';

const contract = z.object({ version: z.number().int(), base: particulars, mine: particulars, at: z.string() });

/** What was typed but not yet saved when the page went away. */
export interface UnsavedCopy {
  /** The draft that the work started from. */
  readonly version: number;
  readonly base: Particulars;
  readonly mine: Particulars;
  /** When it was kept, ISO 8601. */
  readonly at: string;
}

/** Work of the page that is open, and work of a page before it that waits for a person to say what becomes of it. */
const nowKey = (frameId: string): string => `stilepost.unsaved.${frameId}`;
const earlierKey = (frameId: string): string => `stilepost.unsaved-earlier.${frameId}`;

/** Keeps a copy in the browser. Answers false when the browser refuses: storage full or shut off. */
export function keepCopy(storage: Storage, frameId: string, copy: UnsavedCopy): boolean {
  try {
    storage.setItem(nowKey(frameId), JSON.stringify(copy));
    return true;
  } catch {
    return false;
  }
}

/** Everything is saved: the copy has done its work. */
export const dropCopy = (storage: Storage, frameId: string): void => storage.removeItem(nowKey(frameId));

/** The person has said what becomes of the earlier work. */
export const dropEarlierCopy = (storage: Storage, frameId: string): void => storage.removeItem(earlierKey(frameId));

function read(text: string | null): UnsavedCopy | null {
  if (text === null) return null;
  let data: unknown;
  try {
    data = JSON.parse(text);
  } catch {
    return null;
  }
  const found = contract.safeParse(data);
  return found.success ? found.data : null;
}

/**
 * The work that a page before this one could not save; null when there is none. It is put aside, so that the copies
 * of this page do not overwrite it. A copy that can no longer be read (an older format) is dropped.
 */
export function findEarlierCopy(storage: Storage, frameId: string): UnsavedCopy | null {
  const left = storage.getItem(nowKey(frameId));
  if (left !== null) {
    storage.setItem(earlierKey(frameId), left);
    storage.removeItem(nowKey(frameId));
  }
  const copy = read(storage.getItem(earlierKey(frameId)));
  if (copy === null) dropEarlierCopy(storage, frameId);
  return copy;
}
