// A thread that asks for what costs nothing, again and again, and tells the longest wait when it is asked to stop. A thread of its
// own: what the measured work does in this process must not count as a wait.
import { parentPort, workerData } from 'node:worker_threads';

let going = true;
parentPort.once('message', () => (going = false));
let longest = 0;
let answers = 0;
while (going) {
  const from = performance.now();
  const answer = await fetch(workerData);
  await answer.arrayBuffer();
  if (answers++ > 0) longest = Math.max(longest, performance.now() - from);
  await new Promise((done) => setTimeout(done, 5));
}
parentPort.postMessage({ longest, answers });
