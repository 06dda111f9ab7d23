// First file of a worker thread that runs from sources: each thread must load tsx for itself, as the thread that starts
// it may have been set up by something else. Plain JavaScript, as nothing can read TypeScript yet.
import { workerData } from 'node:worker_threads';
import { register } from 'tsx/esm/api';

register();
await import(workerData);
