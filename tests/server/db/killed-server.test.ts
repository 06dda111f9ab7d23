import { mkdtempSync, readdirSync, rmSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { afterAll, describe, expect, it, vi } from 'vitest';
import type { Frame } from '../../../shared/contracts/frames.ts';
import { aFrame } from '../../builders/particulars.ts';
import { expectStatus, PASSWORD } from '../../builders/shops.ts';
import { HttpClient } from '../../setup/http-client.ts';
import { endProcess, startServerProcess, type ServerProcess } from '../../setup/server-process.ts';

vi.setConfig({ testTimeout: 300_000 });

const folder = mkdtempSync(join(tmpdir(), 'stilepost-killed-'));
const start = () => startServerProcess('tests/setup/serve-api.ts', { DATA_DIR: folder });
const startWhole = () => startServerProcess('server/main.ts', { DATA_DIR: folder });
let running: ServerProcess | undefined;
afterAll(() => {
  running?.child.kill('SIGKILL');
  rmSync(folder, { recursive: true, force: true });
});

const KILLS = 5;
const EMAIL = 'owner@shop.example';

/** Saves one width after another until the server is gone; the last version and width that were confirmed, and what was on its way. */
async function saveUntilGone(
  visitor: HttpClient,
  frameId: string,
  from: number,
  saved: (count: number) => void,
): Promise<{ version: number; sent: number }> {
  let version = from;
  for (;;) {
    const particulars = aFrame({ 'outline.width': 20 + version / 64 });
    try {
      const answer = await visitor.put(`/api/frames/${frameId}/draft`, { version, particulars });
      expect(answer.status).toBe(200);
      version = answer.json<{ version: number }>().version;
      saved(version - from);
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
    expectStatus(
      await visitor.post('/api/sign-up', { shopName: 'S', name: 'N', email: EMAIL, password: PASSWORD }),
      201,
    );
    const job = expectStatus(await visitor.post('/api/jobs', { name: 'J' }), 201).json<{ id: string }>();
    const frame = expectStatus(
      await visitor.post(`/api/jobs/${job.id}/frames`, { particulars: aFrame() }),
      201,
    ).json<Frame>();

    // A second one on the same folder is refused while the first one runs.
    await expect(startWhole()).rejects.toThrow(/ended with 1: .*in use by another Stilepost/s);

    let version = frame.version;
    for (let kill = 0; kill < KILLS; kill++) {
      const { child } = running;
      // At another moment of a save each time.
      const killSoon = (count: number) => void (count === 5 && setTimeout(() => child.kill('SIGKILL'), 3 * kill));
      const { version: confirmed, sent } = await saveUntilGone(visitor, frame.id, version, killSoon);
      expect(confirmed).toBeGreaterThanOrEqual(version + 5);
      await endProcess(child, 'SIGKILL');

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
  });

  it('When it is asked to stop, then it ends by itself with 0 and gives the lock back', async () => {
    await endProcess(running!.child, 'SIGKILL');
    for (const signal of ['SIGTERM', 'SIGINT'] as const) {
      running = await startWhole();
      expect((await fetch(`${running.url}/healthz`)).status).toBe(200);
      expect(await endProcess(running.child, signal)).toBe(0);
      expect(running.output()).toContain('Stopping');
      expect(readdirSync(folder)).not.toContain('lock.json');
    }
  });
});
