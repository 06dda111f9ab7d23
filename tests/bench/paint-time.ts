import { readFileSync } from 'node:fs';

/** An event of Chromium's trace: times in microseconds, `t…` of the thread's own clock, which stands still while others work. */
interface TraceEvent {
  readonly name: string;
  readonly ph: string;
  readonly pid: number;
  readonly tid: number;
  readonly ts: number;
  readonly dur?: number;
  readonly tts?: number;
  readonly tdur?: number;
  readonly args?: { readonly data?: { readonly type?: string } };
}

/** What Chromium must be asked to trace for paintTimes. */
export const PAINT_CATEGORIES = ['devtools.timeline', 'disabled-by-default-devtools.timeline'];

const isDispatch = (event: TraceEvent, type: string): boolean =>
  event.name === 'EventDispatch' && event.args?.data?.type === type;

/**
 * For each keystroke that changed an entry: milliseconds that the page's main thread worked from the key going down until
 * the next frame was handed to the compositor (script, style, layout, paint). Waiting for the screen's clock is not work.
 */
export function paintTimes(traceFile: string): number[] {
  const { traceEvents } = JSON.parse(readFileSync(traceFile, 'utf8')) as { traceEvents: TraceEvent[] };
  const inputs = traceEvents.filter((event) => isDispatch(event, 'input'));
  return inputs.map((input) => {
    const own = traceEvents.filter((event) => event.pid === input.pid && event.tid === input.tid && event.ph === 'X');
    const key = own.filter((event) => isDispatch(event, 'keydown') && event.ts <= input.ts).at(-1);
    const commit = own.filter((event) => event.name === 'Commit' && event.ts > input.ts).sort((a, b) => a.ts - b.ts)[0];
    if (key?.tts === undefined || commit?.tts === undefined || commit.tdur === undefined)
      throw new Error('a keystroke without its frame in the trace');
    return (commit.tts + commit.tdur - key.tts) / 1000;
  });
}
