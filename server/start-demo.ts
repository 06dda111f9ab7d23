import type { Database } from './db/database.ts';
import { makeDemo } from './features/demo/demo.service.ts';
import { demoStore } from './features/demo/demo.store.ts';
import { summarizeFrame } from './making/summarize-frame.ts';
import type { Services } from './services.ts';

/** Makes the demo scenario through the same services that people use, where no shop has been opened yet. */
export const startDemo = (
  database: Database,
  { session, jobs, frames, releases }: Services,
  samples: string,
  say: (line: string) => void,
): Promise<boolean> =>
  makeDemo(
    {
      store: demoStore(database),
      openDemoShop: (shop, people) => session.openDemoShop(shop, people),
      addJob: jobs.add,
      addFrame: (who, jobId, particulars) => frames.add(who, jobId, particulars),
      findings: async (particulars) => summarizeFrame(particulars).findings,
      release: (who, frameId, request) => releases.release(who, frameId, request),
    },
    samples,
    say,
  );
