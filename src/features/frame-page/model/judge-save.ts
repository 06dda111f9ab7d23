import { staleDraft } from '#shared/contracts/frames.ts';
import { ApiError } from '../../../lib/api-error.ts';
import { sayError } from '../../../lib/say-error.ts';
import type { SaveFailure } from './autosave.ts';

/** What a failed save means: try again by itself, ask a person, or wait for the next change. */
export function judgeSave(error: unknown): SaveFailure {
  if (!(error instanceof ApiError)) return { kind: 'give-up', why: sayError(error) };
  if (error.code === 'stale-draft') {
    const read = staleDraft.safeParse(error.details);
    return read.success ? { kind: 'stale', stale: read.data } : { kind: 'give-up', why: 'Somebody else saved this frame meanwhile. Reload the page.' };
  }
  const [field] = error.fields;
  const why = field ? field.message : sayError(error);
  // A session that ended is mended over the page; then the next try goes through.
  const mayPass = error.code === 'unreachable' || error.code === 'not-signed-in' || error.code === 'too-many-requests' || error.status >= 500;
  return { kind: mayPass ? 'retry' : 'give-up', why };
}
