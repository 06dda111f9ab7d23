import { readFile } from 'node:fs/promises';
import { join } from 'node:path';
import type { Frame, releaseRequest } from '#shared/contracts/frames.ts';
import { parseFrameFile } from '#shared/contracts/parse-frame-file.ts';
import type { Job } from '#shared/contracts/jobs.ts';
import type { Finding } from '#shared/kernel/checks/finding.ts';
import type { Particulars } from '#shared/kernel/particulars/particulars.ts';
import type { z } from 'zod';
import type { SignedIn } from '../../http/signed-in.ts';
import type { DemoStore } from './demo.store.ts';
import { DEMO_FRAMES, DEMO_JOB, DEMO_PEOPLE, DEMO_SHOP } from './demo-scenario.ts';

/** What the scenario is made with: the same doors that people use. */
export interface DemoGiven {
  readonly store: DemoStore;
  openDemoShop(shop: typeof DEMO_SHOP, people: typeof DEMO_PEOPLE): Promise<SignedIn[]>;
  addJob(shopId: string, name: string): Promise<Job>;
  addFrame(who: SignedIn, jobId: string, particulars: Particulars): Promise<Frame>;
  findings(particulars: Particulars): Promise<readonly Finding[]>;
  release(who: SignedIn, frameId: string, request: z.output<typeof releaseRequest>): Promise<Frame>;
}

async function readSample(folder: string, file: string): Promise<Particulars> {
  const path = join(folder, `${file}.frame.json`);
  const read = parseFrameFile(await readFile(path, 'utf8'));
  if (!read.ok) throw new Error(`${path}: ${read.message} ${read.fields.map((f) => f.message).join('; ')}`);
  return read.particulars;
}

/**
 * Makes the demo shop with its people, its job and its frames, some of them released, where no shop has been opened yet.
 * True when it was made. Throws when a sample cannot be read or released: then a shop without all of it is left.
 */
export async function makeDemo(given: DemoGiven, samples: string, say: (line: string) => void): Promise<boolean> {
  if (!(await given.store.isEmpty())) return false;
  say(`Making the demo shop with ${DEMO_FRAMES.length} frames …`);
  // Read first, so that a bad sample leaves nothing behind.
  const frames = await Promise.all(
    DEMO_FRAMES.map(async ({ file, note }) => ({ note, particulars: await readSample(samples, file) })),
  );
  const people = await given.openDemoShop(DEMO_SHOP, DEMO_PEOPLE);
  const designer = people.find((p) => p.role === 'designer')!;
  const job = await given.addJob(designer.shopId, DEMO_JOB);
  for (const { note, particulars } of frames) {
    const frame = await given.addFrame(designer, job.id, particulars);
    if (note === undefined) continue;
    const cautions = (await given.findings(particulars)).filter((f) => f.level === 'caution').map((f) => f.code);
    await given.release(designer, frame.id, { version: frame.version, note, acknowledged: cautions });
  }
  return true;
}
