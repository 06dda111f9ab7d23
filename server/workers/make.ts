import { parentPort } from 'node:worker_threads';
import { runTask } from '../making/run-task.ts';
import type { TaskAnswer, TaskMessage, Tasks } from '../making/tasks.ts';

// Entry of a worker thread: one message is one task, and has one answer.
const port = parentPort;
if (port === null) throw new Error('this file is the entry of a worker thread and does nothing by itself');

async function answer({ kind, input }: TaskMessage): Promise<TaskAnswer> {
  try {
    return { ok: true, result: await runTask(kind, input as Tasks[typeof kind]['input']) };
  } catch (thrown) {
    const error = thrown instanceof Error ? thrown : new Error(String(thrown));
    const code = 'code' in error && typeof error.code === 'string' ? { code: error.code } : {};
    const proof = 'proof' in error ? { proof: error.proof as Tasks['proof']['result'] } : {};
    return {
      ok: false,
      name: error.name,
      message: error.message,
      stack: error.stack ?? error.message,
      ...code,
      ...proof,
    };
  }
}

port.on('message', (message: TaskMessage) => {
  void answer(message).then((result) => port.postMessage(result));
});
