import { ApiError, type ClientErrorCode } from './api-error.ts';

/** What a person reads. Codes that carry their own sentence (what exactly is wrong) show the server's message. */
const SENTENCES: Record<ClientErrorCode, string | null> = {
  'invalid-input': null,
  'not-signed-in': 'You are signed out. Sign in again; what you typed is still here.',
  'wrong-sign-in': 'No account with this e-mail address and password. Check both.',
  'not-allowed': 'Your role in this shop does not include this. The owner can change that.',
  'not-found': 'It is not here: it never was, or it belongs to another shop.',
  'email-taken': 'There is already an account with this e-mail address. Sign in instead.',
  'name-taken': null,
  'last-owner': null,
  'own-role': null,
  'demo-person': null,
  'stale-draft': 'Somebody else saved this frame meanwhile.',
  'frame-has-stops': 'The frame has stops. Mend them, then release.',
  'cautions-not-acknowledged': 'Look at each caution and tick it, then release.',
  'nothing-changed': 'Nothing has changed since the newest revision.',
  'proof-failed': 'The files read back did not agree with the frame, so they are withheld. Please report this.',
  'drawing-refused': null,
  'too-large': null,
  'too-many-requests': null,
  'cross-site': 'The call came from another site and was refused. Reload the page.',
  internal: 'The server failed at this. What you typed is still here; try again.',
  unreachable: 'The server cannot be reached. Check the connection; what you typed is still here.',
  'unexpected-answer': 'The server answered something this page does not understand. Reload the page.',
};

/** One sentence for a person, for any failure. */
export function sayError(error: unknown): string {
  if (error instanceof ApiError) return SENTENCES[error.code] ?? error.message;
  return error instanceof Error ? error.message : String(error);
}
