import { mkdtempSync, rmSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { afterAll, describe, expect, it } from 'vitest';
import type { Frame } from '../../../shared/contracts/frames.ts';
import { aFrame } from '../../builders/particulars.ts';
import { expectStatus, PASSWORD } from '../../builders/shops.ts';
import { HttpClient } from '../../setup/http-client.ts';
import { endProcess, startServerProcess, type ServerProcess } from '../../setup/server-process.ts';

const folder = mkdtempSync(join(tmpdir(), 'stilepost-killed-'));
const start = () => startServerProcess({ DATA_DIR: folder });
let running: ServerProcess | undefined;
afterAll(() => {
  running?.child.kill('SIGKILL');
  rmSync(folder, { recursive: true, force: true });
});

const KILLS = 5;
const EMAIL = 'owner@shop.example';

/** Saves one width after another until the server is gone; the last version and width that were confirmed, and what was on its way. */
async function saveUntilGone(visitor: HttpClient, frameId: string, from: number): Promise<{ version: number; sent: number }> {
  let version = from;
  for (;;) {
    const particulars = aFrame({ 'outline.width': 20 + version / 64 });
    try {
      const answer = await visitor.put(`/api/frames/${frameId}/draft`, { version, particulars });
      expect(answer.status).toBe(200);
      version = answer.json<{ version: number }>().version;
    } catch (error) {
      if (error instanceof TypeError) return { version, sent: version + 1 };
      throw error;
    }
  }
}

describe('A server that is killed', () => {
  it(`When it is killed ${KILLS} times in the midst of autosaves, then no confirmed save is lost, nobody is signed out, and the lock is taken over`, async () => {
    running = await start();
    let visitor = new HttpClient(running.url);
    expectStatus(await visitor.post('/api/sign-up', { shopName: 'S', name: 'N', email: EMAIL, password: PASSWORD }), 201);
    const job = expectStatus(await visitor.post('/api/jobs', { name: 'J' }), 201).json<{ id: string }>();
    const frame = expectStatus(await visitor.post(`/api/jobs/${job.id}/frames`, { particulars: aFrame() }), 201).json<Frame>();

    // A second one on the same folder is refused while the first one runs.
    await expect(start()).rejects.toThrow(/ended with 1: .*in use by another Stilepost/s);

    let version = frame.version;
    for (let kill = 0; kill < KILLS; kill++) {
      const saving = saveUntilGone(visitor, frame.id, version);
      await new Promise((resolve) => setTimeout(resolve, 400 + 170 * kill));
      await endProcess(running.child, 'SIGKILL');
      const { version: confirmed, sent } = await saving;
      expect(confirmed).toBeGreaterThan(version);

      running = await start();
      const { cookie } = visitor;
      visitor = new HttpClient(running.url);
      visitor.useCookie(cookie);
      const now = expectStatus(await visitor.get(`/api/frames/${frame.id}`), 200).json<Frame>();
      // What was on its way may have been saved without its confirmation having arrived; nothing older may stand there.
      expect([confirmed, sent]).toContain(now.version);
      expect(now.particulars).toEqual(aFrame({ 'outline.width': 20 + (now.version - 1) / 64 }));
      version = now.version;
    }
  }, 240_000);

  it('When it is asked to stop, then it ends by itself with 0 and gives the lock back', async () => {
    const { child, output } = running!;
    expect(await endProcess(child, 'SIGTERM')).toBe(0);
    expect(output()).toContain('Stopping');
    running = await start();
    expect(await endProcess(running.child, 'SIGINT')).toBe(0);
    running = undefined;
  }, 60_000);
});
