import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import {
  cutterChanged,
  cutterList,
  cuttersRead,
  storedCutter,
  DRAWER_LIMITS,
  type CuttersRead,
  type StoredCutter,
} from '../../../shared/contracts/cutters.ts';
import { cuttersStore } from '../../../server/features/cutters/cutters.store.ts';
import { newFrame } from '../../../shared/kernel/particulars/new-frame.ts';
import { setField } from '../../../shared/kernel/particulars/set-field.ts';
import { addFrame, addJob, addPerson, expectStatus, openShop, releaseFrame } from '../../builders/shops.ts';
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

const aCutter = (name: string, change: object = {}) => ({
  unit: 'in',
  cutter: { kind: 'straight', name, diameter: 0.25, fluteLength: 1, ...change },
});
const list = async (who = visitor) => cutterList.parse((await who.get('/api/cutters')).json()).cutters;
const add = async (name: string, change: object = {}, who = visitor): Promise<StoredCutter> =>
  storedCutter.parse(expectStatus(await who.post('/api/cutters', aCutter(name, change)), 201).json());
const named = async (name: string, who = visitor) => (await list(who)).find((c) => c.cutter.name === name)!;

const HEADER = 'name,unit,kind,diameter,flute length,max pass,remarks';
const send = (lines: readonly string[], take = '', who = visitor) => {
  const form = new FormData();
  form.append('file', new Blob([lines.join('\r\n')]), 'cutters.csv');
  return who.post(`/api/cutters/csv${take}`, form);
};
const read = async (...given: Parameters<typeof send>): Promise<CuttersRead> =>
  cuttersRead.parse(expectStatus(await send(...given), 200).json());

describe('The cutter drawer', () => {
  it.each([
    ['in', 'Straight 3/8', 0.375],
    ['mm', 'Straight 10', 10],
  ] as const)(
    'When a shop in %s is new, then its drawer holds common sizes of that unit',
    async (unit, name, diameter) => {
      const { visitor: fresh } = await openShop(server, { unit });
      const cutters = await list(fresh);
      expect(new Set(cutters.map((c) => c.unit))).toEqual(new Set([unit]));
      expect(new Set(cutters.map((c) => c.cutter.kind))).toEqual(new Set(['straight', 'tapered', 'vee', 'beading']));
      expect(cutters.find((c) => c.cutter.name === name)?.cutter).toMatchObject({ kind: 'straight', diameter });
    },
  );

  it('When a cutter is put in, then it is in the list with what was entered', async () => {
    const { id } = await add('Ours', { number: 7, maxPass: 0.5 });
    expect((await list()).find((c) => c.id === id)).toEqual({
      id,
      ...aCutter('Ours', { number: 7, maxPass: 0.5 }),
      remarks: '',
    });
  });

  it('When its numbers cannot be, then each field is named with what it takes', async () => {
    const answer = await visitor.post('/api/cutters', aCutter('Wrong', { diameter: -1, maxPass: 2 }));
    expect(answer.status).toBe(400);
    expect(answer.json<{ fields: unknown[] }>().fields).toMatchObject([
      { path: 'cutter.diameter', got: '-1', takes: 'a length above 0' },
    ]);
    const deep = await visitor.post('/api/cutters', aCutter('Deep', { maxPass: 2 }));
    expect(deep.json<{ fields: unknown[] }>().fields).toMatchObject([
      { path: 'cutter.maxPass', takes: 'at most the flute length, 1' },
    ]);
  });

  it.each([
    ['Twice', 'One'],
    ['TWICE', 'Two'],
  ])('When the name %j is taken, then it is refused, put in or changed', async (name, another) => {
    if (!(await named('Twice'))) await add('Twice');
    expect((await visitor.post('/api/cutters', aCutter(name))).json()).toMatchObject({ code: 'name-taken' });
    const other = await add(another);
    const answer = await visitor.put(`/api/cutters/${other.id}`, aCutter(name));
    expect(answer.status).toBe(409);
    expect((await named(another)).id).toBe(other.id);
  });

  it('When another shop has a cutter of that name, then that is nothing to this one', async () => {
    const { visitor: other } = await openShop(server);
    await add('Everybody has one');
    await add('Everybody has one', {}, other);
    const { id } = await named('Everybody has one', other);
    expect((await visitor.put(`/api/cutters/${id}`, aCutter('Mine now'))).status).toBe(404);
    expect((await visitor.delete(`/api/cutters/${id}`)).status).toBe(404);
    expect((await named('Everybody has one', other)).id).toBe(id);
  });

  it('When a designer looks, then the drawer can be read and not changed', async () => {
    const shop = await openShop(server);
    const { visitor: designer } = await addPerson(server, shop.session.shop.id, 'designer');
    expect((await list(designer)).length).toBeGreaterThan(0);
    expect((await designer.post('/api/cutters', aCutter('Not mine'))).status).toBe(403);
    expect((await send([HEADER, 'Not mine,in,straight,0.25,1,,'], '', designer)).status).toBe(403);
    const { visitor: programmer } = await addPerson(server, shop.session.shop.id, 'programmer');
    await add('By the programmer', {}, programmer);
  });
});

describe('A change of a cutter', () => {
  it('When drafts carry its numbers, then they are listed with the work it does; others, removed ones and revisions are not', async () => {
    const { visitor: owner } = await openShop(server);
    const job = await addJob(owner, 'Kitchen');
    const uses = await addFrame(owner, job.id, newFrame('in', 'Uses it'));
    await addFrame(
      owner,
      job.id,
      setField(
        setField(
          setField(newFrame('in', 'Another size'), 'cutters.dado.diameter', 0.25),
          'cutters.squaring.diameter',
          0.25,
        ),
        'cutters.perimeter.diameter',
        0.25,
      ),
    );
    await addFrame(
      owner,
      job.id,
      setField(newFrame('in', 'Only the dado'), 'cutters.squaring.name', 'Of the other machine'),
    );
    const away = await addFrame(owner, job.id, newFrame('in', 'Put away'));
    expectStatus(await owner.patch(`/api/frames/${away.id}`, { removed: true }), 200);
    await releaseFrame(owner, uses, ['thin-wall']);

    const { id, cutter } = await named('Straight 3/8', owner);
    const answer = expectStatus(
      await owner.put(`/api/cutters/${id}`, { unit: 'in', cutter: { ...cutter, diameter: 0.374 } }),
      200,
    );
    const changed = cutterChanged.parse(answer.json());
    expect(changed.changes).toEqual(['diameter']);
    expect(changed.cutter?.cutter).toMatchObject({ diameter: 0.374 });
    expect(changed.drafts.map(({ frameName, jobName, roles }) => [frameName, jobName, [...roles].sort()])).toEqual([
      ['Uses it', 'Kitchen', ['dado', 'perimeter', 'squaring']],
      ['Only the dado', 'Kitchen', ['dado', 'perimeter']],
    ]);
    // The draft and the revision keep their own copy until somebody saves another.
    expect((await owner.get(`/api/frames/${uses.id}`)).json()).toMatchObject({
      version: 1,
      particulars: { cutters: { dado: { diameter: 0.375 } } },
    });
    expect((await owner.get(`/api/frames/${uses.id}/revisions/A`)).json()).toMatchObject({
      particulars: { cutters: { dado: { diameter: 0.375 } } },
    });
  });

  it('When only the remarks change, then no draft is touched', async () => {
    const { visitor: owner } = await openShop(server);
    await addFrame(owner, (await addJob(owner)).id, newFrame('in', 'Frame'));
    const { id, unit, cutter } = await named('Straight 3/8', owner);
    const answer = await owner.put(`/api/cutters/${id}`, { unit, cutter, remarks: 'Sharpened' });
    expect(cutterChanged.parse(answer.json())).toMatchObject({
      cutter: { remarks: 'Sharpened' },
      changes: [],
      drafts: [],
    });
  });

  it('When a millimetre cutter is taken out, then inch drafts that carry it are listed too, and it can be put back', async () => {
    const { visitor: owner } = await openShop(server, { unit: 'mm' });
    const metric = expectStatus(
      await owner.post('/api/cutters', {
        unit: 'mm',
        cutter: { kind: 'straight', name: 'Exact 9.525', diameter: 9.525, fluteLength: 31.75, maxPass: 12.7 },
      }),
      201,
    ).json<StoredCutter>();
    await addFrame(owner, (await addJob(owner)).id, newFrame('in', 'In inches'));
    const answer = cutterChanged.parse(expectStatus(await owner.delete(`/api/cutters/${metric.id}`), 200).json());
    expect(answer).toMatchObject({ cutter: null, changes: ['removed'], drafts: [{ frameName: 'In inches' }] });
    expect(await named('Exact 9.525', owner)).toBeUndefined();
    expect((await owner.delete(`/api/cutters/${metric.id}`)).status).toBe(404);
    const { unit, cutter, remarks } = metric;
    expectStatus(await owner.post('/api/cutters', { unit, cutter, remarks }), 201);
  });
});

describe('Cutters as CSV', () => {
  it('When a drawer is exported and read into an empty one, then it is the same drawer', async () => {
    const { visitor: other } = await openShop(server, { unit: 'mm' });
    for (const { id } of await list(other)) await other.delete(`/api/cutters/${id}`);
    await add('=1+1, "quoted"', { number: 3 });
    const file = expectStatus(await visitor.get('/api/cutters/csv'), 200);
    expect(file.headers.get('content-type')).toBe('text/csv; charset=utf-8');
    expect(file.headers.get('content-disposition')).toContain('cutters.csv');
    const answer = await read([new TextDecoder().decode(file.bytes)], '?take=true', other);
    expect(answer.problems).toEqual([]);
    const bare = (cutters: readonly StoredCutter[]) =>
      cutters.map(({ unit, cutter, remarks }) => ({ unit, cutter, remarks }));
    expect(bare(await list(other))).toEqual(bare(await list()));
  });

  it('When a row is bad, then line and column are named and nothing is taken until the good ones are asked for', async () => {
    const lines = [
      HEADER,
      'Good one,in,straight,0.25,1,,',
      'Bad one,in,straight,wide,1,,',
      'Good one,in,straight,0.5,1,,',
    ];
    const refused = await read(lines);
    expect(refused).toMatchObject({
      rows: [{ line: 2, name: 'Good one', is: 'new', changes: [] }],
      added: [],
      changed: [],
    });
    expect(refused.problems.map(({ line, column }) => [line, column])).toEqual([
      [3, 'diameter'],
      [4, 'name'],
    ]);
    expect(refused.problems[0]).toMatchObject({ got: '"wide"', takes: 'a number with a decimal point, such as 9.525' });
    expect(await named('Good one')).toBeUndefined();

    const kept = await read(lines, '?take=true');
    expect(kept.problems).toEqual(refused.problems);
    expect(kept.added.map((c) => c.cutter.name)).toEqual(['Good one']);
    expect((await named('Good one')).cutter).toMatchObject({ diameter: 0.25 });
    expect(await named('Bad one')).toBeUndefined();
  });

  it('When a row has the name of a cutter in the drawer, then it is told as changed or the same, and changed only when taken', async () => {
    const { visitor: owner } = await openShop(server);
    const was = await add('Spiral', { maxPass: 0.5, number: 4 }, owner);
    const asItIs = await add('Compression', {}, owner);
    await addFrame(
      owner,
      (await addJob(owner)).id,
      setField(newFrame('in', 'Carries it'), 'cutters.dado', { ...was.cutter, name: 'Spiral' }),
    );
    const lines = [
      HEADER,
      'SPIRAL,in,straight,0.247,1,0.5,reground',
      'Compression,in,straight,0.25,1,,',
      'Another,in,straight,0.125,0.5,,',
    ];
    const looked = await read(lines, '', owner);
    expect(looked.rows).toEqual([
      {
        line: 2,
        name: 'SPIRAL',
        is: 'changed',
        changes: [
          { column: 'name', was: 'Spiral', is: 'SPIRAL' },
          { column: 'diameter', was: '0.25', is: '0.247' },
          { column: 'remarks', was: '', is: 'reground' },
        ],
      },
      { line: 3, name: 'Compression', is: 'same', changes: [] },
      { line: 4, name: 'Another', is: 'new', changes: [] },
    ]);
    expect(looked).toMatchObject({ problems: [], added: [], changed: [] });
    expect(await named('Spiral', owner)).toEqual(was);
    expect(await named('Another', owner)).toBeUndefined();

    const held = (await list(owner)).length;
    const taken = await read(lines, '?take=true', owner);
    expect(taken.added.map((c) => c.cutter.name)).toEqual(['Another']);
    expect(taken.changed).toMatchObject([
      {
        before: was,
        answer: {
          cutter: { id: was.id },
          changes: ['diameter', 'name'],
          drafts: [{ frameName: 'Carries it', roles: ['dado'] }],
        },
      },
    ]);
    // The file has no column for the number in the machine, which therefore stays.
    expect(await named('SPIRAL', owner)).toEqual({
      id: was.id,
      unit: 'in',
      cutter: { ...was.cutter, name: 'SPIRAL', diameter: 0.247 },
      remarks: 'reground',
    });
    expect(await named('Compression', owner)).toEqual(asItIs);
    expect(await list(owner)).toHaveLength(held + 1);
    expect((await read(lines, '', owner)).rows.map(({ is }) => is)).toEqual(['same', 'same', 'same']);
  });

  const NUMBERED = 'name,unit,kind,number,diameter,flute length';
  it.each([
    ['a row has its number and its kind', ['Renamed,in,straight,7,0.25,1'], ['changed']],
    ['a row has its number and another kind', ['Renamed,in,vee,7,,1'], []],
    ['two rows have its number', ['Renamed,in,straight,7,0.25,1', 'Other,in,straight,7,0.25,1'], ['new', 'new']],
    [
      'another row has its name',
      ['Renamed,in,straight,7,0.25,1', 'In slot seven,in,straight,,0.25,1'],
      ['new', 'changed'],
    ],
  ])('When no cutter has the name and %s, then the row is told so', async (_what, rows, expected) => {
    const { visitor: owner } = await openShop(server);
    await add('In slot seven', { number: 7 }, owner);
    const answer = await read([NUMBERED, ...rows], '', owner);
    expect(answer.rows.map(({ is }) => is)).toEqual(expected);
  });

  it('When a cutter to change is taken out meanwhile, then nothing of the file is taken', async () => {
    const { visitor: owner, session } = await openShop(server);
    const { unit, cutter, remarks, id } = await add('Gone soon', {}, owner);
    await owner.delete(`/api/cutters/${id}`);
    const held = await list(owner);
    const fresh = { id: 'fresh', unit, cutter: { ...cutter, name: 'Fresh' }, remarks };
    const store = cuttersStore(server.database);
    expect(await store.take(session.shop.id, [fresh], [{ id, unit, cutter, remarks }], new Date(0))).toBe(false);
    expect(await store.take(session.shop.id, [], [{ ...fresh, id: held[0]!.id }], new Date(0))).toBe(true);
    expect((await list(owner)).length).toBe(held.length);
  });

  it('When what the drawer keeps does not go with a row, then the column is named and the cutter stays', async () => {
    const { visitor: owner } = await openShop(server);
    const was = await add('Long', { maxPass: 0.75 }, owner);
    const answer = await read(
      ['name,unit,kind,diameter,flute length', 'Long,in,straight,0.25,0.5'],
      '?take=true',
      owner,
    );
    expect(answer).toMatchObject({
      rows: [],
      changed: [],
      problems: [{ line: 2, column: 'max pass', takes: 'at most the flute length, 0.5' }],
    });
    expect(await named('Long', owner)).toEqual(was);
  });

  it('When a column is missing, then it is named', async () => {
    const { added, problems } = await read(['name,unit,kind', 'A,in,straight'], '?take=true');
    expect(added).toEqual([]);
    expect(problems[0]).toMatchObject({ line: 1 });
    expect(problems[0]!.message).toContain('flute length');
  });

  it('When the file is none, then the field says what it takes', async () => {
    const bad = async (make: (form: FormData) => void) => {
      const form = new FormData();
      make(form);
      const answer = await visitor.post('/api/cutters/csv', form);
      expect(answer.status).toBe(400);
      return answer.json<{ fields: { path: string; takes: string }[] }>().fields[0]!;
    };
    expect(await bad(() => undefined)).toMatchObject({ path: 'file', takes: 'one CSV file' });
    expect(await bad((f) => f.append('file', new Blob([HEADER]), 'a.csv'))).toMatchObject({ path: 'file' });
    expect((await bad((f) => f.append('file', new Blob([new Uint8Array([0xff, 0xfe, 0])]), 'a.csv'))).takes).toContain(
      'UTF-8',
    );
    expect(
      (await bad((f) => f.append('file', new Blob(['x'.repeat(DRAWER_LIMITS.csvBytes + 1)]), 'a.csv'))).takes,
    ).toContain('bytes');
    expect((await send([HEADER], '?take=perhaps')).json<{ fields: unknown[] }>().fields).toMatchObject([
      { path: 'take' },
    ]);
  });

  it('When the drawer would hold too many, then nothing is taken', async () => {
    const { visitor: other } = await openShop(server);
    const held = (await list(other)).length;
    const rows = Array.from({ length: DRAWER_LIMITS.cutters - held + 1 }, (_, i) => `Cutter ${i},in,straight,0.25,1,,`);
    const answer = await send([HEADER, ...rows], '?take=true', other);
    expect(answer.status).toBe(400);
    expect(answer.json<{ fields: unknown[] }>().fields).toMatchObject([
      { path: 'cutters', got: '501 in the drawer', takes: 'at most 500' },
    ]);
    expect(await list(other)).toHaveLength(held);
    expect((await read([HEADER, ...rows.slice(1)], '?take=true', other)).added).toHaveLength(rows.length - 1);
  });
});
