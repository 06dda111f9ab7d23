// A worker that does what its task says: answers, breaks down, ends, fills its memory, or never comes back.
import { parentPort, threadId } from 'node:worker_threads';

parentPort.on('message', ({ input }) => {
  switch (input.act) {
    case 'answer':
      return parentPort.postMessage({ ok: true, result: threadId });
    case 'refuse':
      return parentPort.postMessage({
        ok: false,
        name: 'ProofFailed',
        message: 'no',
        stack: '',
        proof: { ok: false, checks: [] },
      });
    case 'break':
      throw new Error('broken');
    case 'end':
      return process.exit(3);
    case 'hoard': {
      const hoard = [];
      for (;;) hoard.push(new Array(1e6).fill(threadId));
    }
    case 'hang':
      for (;;);
  }
});
