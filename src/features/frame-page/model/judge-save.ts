import { staleDraft } from '#shared/contracts/frames.ts';
import { ApiError, type ClientErrorCode } from '../../../lib/api-error.ts';
import { sayError } from '../../../lib/say-error.ts';
import type { SaveFailure } from './autosave.ts';

/** The title block has little room. */
const SHORT: Partial<Record<ClientErrorCode, string>> = {
  unreachable: 'no connection to the server.',
  'not-signed-in': 'you are signed out.',
  'not-allowed': 'your role may not change it.',
  internal: 'the server failed at it.',
};

/** What a failed save means: try again by itself, ask a person, or wait for the next change. */
export function judgeSave(error: unknown): SaveFailure {
  if (!(error instanceof ApiError)) return { kind: 'give-up', why: sayError(error) };
  if (error.code === 'stale-draft') {
    const read = staleDraft.safeParse(error.details);
    return read.success
      ? { kind: 'stale', stale: read.data }
      : { kind: 'give-up', why: 'Somebody else saved this frame meanwhile. Reload the page.' };
  }
  const [field] = error.fields;
  const why = field ? field.message : (SHORT[error.code] ?? sayError(error));
  // A session that ended is mended over the page; then the next try goes through.
  const mayPass =
    error.code === 'unreachable' ||
    error.code === 'not-signed-in' ||
    error.code === 'too-many-requests' ||
    error.status >= 500;
  return { kind: mayPass ? 'retry' : 'give-up', why };
}
