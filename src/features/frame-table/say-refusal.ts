import { sayError } from '../../lib/say-error.ts';
import { fieldMessagesOf } from '../../lib/field-messages.ts';

/** Why the server took nothing, with the lines of the rows it speaks of. `lines`: of each frame that was sent. */
export function sayRefusal(error: unknown, lines: readonly number[]): string {
  const fields = Object.entries(fieldMessagesOf(error)).map(([path, message]) => {
    const place = /^frames\.(\d+)\.(.*)$/.exec(path);
    const line = place ? lines[Number(place[1])] : undefined;
    return line === undefined ? `${path}: ${message}` : `Line ${line}, ${place![2]}: ${message}`;
  });
  return [sayError(error), ...fields].join(' ');
}
