import { DrawingRefused } from '#shared/kernel/drawing/drawing-refused.ts';
import { JobList, type JobNews } from './job-list.ts';
import type { Answer, FromWorker, ToWorker } from './messages.ts';
import type { Wish } from './picture.ts';
import { Workshop } from './workshop.ts';

/** How long to work before looking whether there is a new message. */
const STRETCH_MS = 25;

// A worker's own window, as far as it is used here; the compiler has the page's in its place.
const scope = self as unknown as {
  postMessage(message: FromWorker, transfer: Transferable[]): void;
  onmessage: ((event: MessageEvent<ToWorker>) => void) | null;
};

/** Pictures before slices before numbers: what a person waits for comes first. */
const RANKS: Record<Wish['kind'], number> = { look: 0, relief: 0, slice: 1, measure: 2 };

let makeWorkshop: () => Workshop = () => {
  throw new Error('asked before there was a frame');
};

/** Buffers of an answer that the page gets for good, so that nothing is copied. */
function buffersOf(answer: object): Transferable[] {
  return Object.values(answer).flatMap((value: unknown) => {
    if (ArrayBuffer.isView(value)) return [value.buffer as ArrayBuffer];
    return typeof value === 'object' && value !== null && !Array.isArray(value) ? buffersOf(value) : [];
  });
}

function tell(news: JobNews<Answer>): void {
  if (news.kind === 'progress') return scope.postMessage(news, []);
  if (news.kind === 'answer') return scope.postMessage(news, buffersOf(news.answer));
  const { id, error } = news;
  if (error instanceof DrawingRefused) return scope.postMessage({ kind: 'refused', id, reason: error.message }, []);
  scope.postMessage({ kind: 'failed', id, message: error instanceof Error ? error.message : String(error) }, []);
}

const jobs = new JobList<Answer>(tell, () => performance.now());
let isRunning = false;

function run(): void {
  jobs.run(STRETCH_MS);
  isRunning = !jobs.isIdle;
  if (isRunning) setTimeout(run, 0);
}

/** The workshop is made with the first piece of work, so that its refusal is that job's. */
function* workOn(wish: Wish): Generator<number, Answer, void> {
  const workshop = makeWorkshop();
  switch (wish.kind) {
    case 'look':
      return yield* workshop.look(wish);
    case 'slice':
      return yield* workshop.slice(wish);
    case 'relief':
      return yield* workshop.relief(wish);
    case 'measure':
      return yield* workshop.measure();
  }
}

scope.onmessage = ({ data }) => {
  if (data.kind === 'frame') {
    jobs.clear();
    let made: Workshop | undefined;
    makeWorkshop = () => (made ??= new Workshop(data.worked, data.profile));
    return;
  }
  if (data.kind === 'cancel') return jobs.cancel(data.id);
  jobs.add({ id: data.id, rank: RANKS[data.wish.kind], work: workOn(data.wish) });
  if (!isRunning) {
    isRunning = true;
    run();
  }
};
