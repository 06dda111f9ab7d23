import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { profileList, storedProfile, type StoredProfile } from '../../../shared/contracts/profiles.ts';
import { BUILTIN_PROFILES } from '../../../shared/kernel/profiles/builtin-profiles.ts';
import { expectStatus, openShop } from '../../builders/shops.ts';
import type { HttpClient } from '../../setup/http-client.ts';
import { allowSlowMachine } from '../../setup/slow-machine.ts';
import { startTestServer, type TestServer } from '../../setup/test-server.ts';

allowSlowMachine();

let server: TestServer;
let visitor: HttpClient;
beforeAll(async () => {
  server = await startTestServer();
  visitor = (await openShop(server)).visitor;
});
afterAll(() => server.close());

const aProfile = (change: object = {}) => ({ ...BUILTIN_PROFILES[0]!.profile, name: 'Ours', ...change });
const add = async (change: object): Promise<StoredProfile> =>
  storedProfile.parse(expectStatus(await visitor.post('/api/profiles', aProfile(change)), 201).json());
const list = async () => profileList.parse((await visitor.get('/api/profiles')).json()).profiles;

describe('File profiles', () => {
  it('When a shop is new, then it has the three built-in ones', async () => {
    const fresh = (await openShop(server)).visitor;
    const { profiles } = profileList.parse((await fresh.get('/api/profiles')).json());
    expect(profiles.map((p) => [p.id, p.builtIn])).toEqual(BUILTIN_PROFILES.map((p) => [p.id, true]));
    expect(profiles).toHaveLength(3);
  });

  it('When profiles are made, then they come after the built-in ones, by name', async () => {
    await add({ name: 'zeta' });
    await add({ name: 'Alpha', flavour: 'R12', unit: 'mm', decimals: 4 });
    expect((await list()).slice(3).map((p) => p.profile.name)).toEqual(['Alpha', 'zeta']);
    expect((await list())[3]!.profile).toMatchObject({ flavour: 'R12', unit: 'mm', decimals: 4 });
  });

  it.each(['Taken', 'taken', BUILTIN_PROFILES[1]!.profile.name.toUpperCase()])(
    'When the name %j is taken, then it is refused',
    async (name) => {
      await visitor.post('/api/profiles', aProfile({ name: 'Taken' }));
      const answer = await visitor.post('/api/profiles', aProfile({ name }));
      expect(answer.status).toBe(409);
      expect(answer.json().code).toBe('name-taken');
    },
  );

  it.each(['{face}', '{colour}', 'ALL'])(
    'When the template %j does not tell line sets apart, then the field is named',
    async (layerTemplate) => {
      const answer = await visitor.post('/api/profiles', aProfile({ name: `T ${layerTemplate}`, layerTemplate }));
      expect(answer.status).toBe(400);
      expect(answer.json<{ fields: unknown[] }>().fields).toMatchObject([
        { path: 'layerTemplate', got: JSON.stringify(layerTemplate) },
      ]);
    },
  );

  it('When decimals are not 4 to 6, then the field is named', async () => {
    const answer = await visitor.post('/api/profiles', aProfile({ decimals: 3 }));
    expect(answer.json<{ fields: unknown[] }>().fields).toMatchObject([{ path: 'decimals', got: '3' }]);
  });

  it('When a profile is changed and deleted, then so it is', async () => {
    const { id } = await add({ name: 'Passing' });
    expectStatus(await visitor.put(`/api/profiles/${id}`, aProfile({ name: 'Passing', origin: 'frame' })), 200);
    expect((await list()).find((p) => p.id === id)?.profile.origin).toBe('frame');
    expectStatus(await visitor.delete(`/api/profiles/${id}`), 204);
    expect((await list()).some((p) => p.id === id)).toBe(false);
  });

  it('When a built-in one is to be changed or deleted, then it is refused', async () => {
    const path = `/api/profiles/${BUILTIN_PROFILES[0]!.id}`;
    expect((await visitor.put(path, aProfile())).status).toBe(403);
    expect((await visitor.delete(path)).status).toBe(403);
  });

  it("When the shop's default is deleted, then the first built-in one is the default again", async () => {
    const { id } = await add({ name: 'Default' });
    expect(expectStatus(await visitor.patch('/api/shop', { defaultProfileId: id }), 200).json()).toMatchObject({
      defaultProfileId: id,
    });
    expectStatus(await visitor.delete(`/api/profiles/${id}`), 204);
    expect((await visitor.get('/api/session')).json()).toMatchObject({
      shop: { defaultProfileId: BUILTIN_PROFILES[0]!.id },
    });
  });

  it('When a shop changes its settings, then they are in the session', async () => {
    const { visitor: owner } = await openShop(server);
    expectStatus(await owner.patch('/api/shop', { name: 'New name', unit: 'mm', paper: 'A4' }), 200);
    expect((await owner.get('/api/session')).json()).toMatchObject({
      shop: { name: 'New name', unit: 'mm', paper: 'A4' },
    });
    expect((await owner.patch('/api/shop', {})).status).toBe(200);
    expect((await owner.patch('/api/shop', { paper: 'A0' })).status).toBe(400);
  });
});
