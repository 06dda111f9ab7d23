import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { edgePresetList, storedEdgePreset } from '../../../shared/contracts/edge-presets.ts';
import { usualEdgePresets } from '../../../shared/kernel/starters/usual-edge-presets.ts';
import { addPerson, expectStatus, openShop } from '../../builders/shops.ts';
import type { HttpClient } from '../../setup/http-client.ts';
import { allowSlowMachine } from '../../setup/slow-machine.ts';
import { startTestServer, type TestServer } from '../../setup/test-server.ts';

allowSlowMachine();

let server: TestServer;
let visitor: HttpClient;
let shopId: string;
beforeAll(async () => {
  server = await startTestServer();
  const opened = await openShop(server);
  visitor = opened.visitor;
  shopId = opened.session.shop.id;
});
afterAll(() => server.close());

const BEADED = usualEdgePresets('in')[1]!;
const list = async (who = visitor) => edgePresetList.parse((await who.get('/api/edge-presets')).json()).presets;

describe('Edge presets', () => {
  it('When a designer saves an edge, then the shop has it, and another shop has not', async () => {
    const { visitor: designer } = await addPerson(server, shopId, 'designer');
    const { visitor: other } = await openShop(server);
    const saved = expectStatus(await designer.post('/api/edge-presets', { ...BEADED, name: 'Ours' }), 201);
    const { id, preset } = storedEdgePreset.parse(saved.json());
    expect(preset).toEqual({ ...BEADED, name: 'Ours' });
    expect((await list()).find((entry) => entry.id === id)?.preset).toEqual(preset);
    expect(await list(other)).toEqual([]);
    expect((await other.delete(`/api/edge-presets/${id}`)).status).toBe(404);
    expectStatus(await designer.delete(`/api/edge-presets/${id}`), 204);
    expect((await list()).some((entry) => entry.id === id)).toBe(false);
  });

  it('When several are saved, then they come by name, and a name is taken whatever its case', async () => {
    for (const name of ['Edge 10', 'edge 9', 'A']) await visitor.post('/api/edge-presets', { ...BEADED, name });
    expect((await list()).map(({ preset }) => preset.name)).toEqual(['A', 'edge 9', 'Edge 10']);
    const again = await visitor.post('/api/edge-presets', { ...BEADED, name: 'EDGE 9' });
    expect(again.status).toBe(409);
    expect(again.json()).toMatchObject({ code: 'name-taken' });
  });

  it('When an entry is wrong, then it is named with what it takes', async () => {
    const bead = { radius: 0, drop: 0.01, quirk: 0.125 };
    const answer = await visitor.post('/api/edge-presets', { ...BEADED, name: 'Flat', edge: { ...BEADED.edge, bead } });
    expect(answer.status).toBe(400);
    expect(answer.json<{ fields: unknown[] }>().fields).toMatchObject([
      { path: 'edge.bead.radius', got: '0', takes: 'a length above 0' },
    ]);
    const perimeter = BEADED.cutters.quirk;
    const other = await visitor.post('/api/edge-presets', { ...BEADED, name: 'Other', cutters: { perimeter } });
    expect(other.json<{ fields: unknown[] }>().fields).toMatchObject([{ path: 'cutters.perimeter' }]);
  });
});
