import { createHash } from 'node:crypto';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { errorBody } from '../../../shared/contracts/error-codes.ts';
import { frame as frameContract } from '../../../shared/contracts/frames.ts';
import { jobPage } from '../../../shared/contracts/jobs.ts';
import { LIMITS } from '../../../shared/contracts/limits.ts';
import {
  drawingRefused,
  tracedFramesAdded,
  tracing as tracingContract,
  tracingList,
  type TracedFramesRequest,
  type Tracing,
} from '../../../shared/contracts/tracings.ts';
import { PLAIN_TRACE, type TracedDrawing, type TraceOptions } from '../../../shared/kernel/tracing/traced-drawing.ts';
import { drawing, frameDrawing, rectangleLines } from '../../builders/drawings.ts';
import { addJob, expectStatus, openShop } from '../../builders/shops.ts';
import type { Answer, HttpClient } from '../../setup/http-client.ts';
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

async function upload(
  content: string | Uint8Array<ArrayBuffer>,
  name = 'kitchen.dxf',
  field = 'file',
): Promise<Answer> {
  const { id: jobId } = await addJob(visitor);
  const form = new FormData();
  form.append(field, new Blob([content]), name);
  return visitor.send('POST', `/api/jobs/${jobId}/tracings`, { body: form });
}
const uploaded = async (content: string, name?: string): Promise<Tracing> =>
  tracingContract.parse(expectStatus(await upload(content, name), 201).json());

const ask = (tracing: Tracing, options: Partial<TraceOptions> = {}) =>
  visitor.post(`/api/tracings/${tracing.id}/reading`, { options: { ...PLAIN_TRACE, ...options } });
const reading = async (tracing: Tracing, options?: Partial<TraceOptions>): Promise<TracedDrawing> =>
  expectStatus(await ask(tracing, options), 200).json<TracedDrawing>();

const addFrames = (tracing: Tracing, wanted: Partial<TracedFramesRequest> = {}) =>
  visitor.post(`/api/tracings/${tracing.id}/frames`, {
    options: PLAIN_TRACE,
    confirmed: false,
    roles: ['perimeter', 'opening'],
    frames: [{ name: 'Sink base', asMembers: false }],
    ...wanted,
  });
/** The reason of a refusal, and that nothing came into the job. */
async function refusedFor(tracing: Tracing, answer: Answer): Promise<string> {
  const body = errorBody.parse(expectStatus(answer, 422).json());
  expect(body.code).toBe('drawing-refused');
  expect(jobPage.parse((await visitor.get(`/api/jobs/${tracing.jobId}`)).json()).frames).toEqual([]);
  return drawingRefused.parse(body.details).reason;
}

describe('Uploading a drawing', () => {
  it('When it is there, then it can be listed, and comes back byte for byte under its own name', async () => {
    const text = frameDrawing();
    const tracing = await uploaded(text, 'Küche 1.dxf');
    expect(tracing).toMatchObject({ fileName: 'Küche 1.dxf', bytes: text.length, frames: [], removed: false });
    expect(tracing.sha256).toBe(createHash('sha256').update(text).digest('hex'));
    const listed = tracingList.parse((await visitor.get(`/api/jobs/${tracing.jobId}/tracings`)).json());
    expect(listed.tracings).toEqual([tracing]);
    const file = expectStatus(await visitor.get(`/api/tracings/${tracing.id}/file`), 200);
    expect(new TextDecoder().decode(file.bytes)).toBe(text);
    expect(file.headers.get('content-disposition')).toContain("filename*=UTF-8''K%C3%BCche%201.dxf");
  });

  it('When it is put away, then it is listed no more, until it is brought back', async () => {
    const tracing = await uploaded(frameDrawing());
    const ids = async () =>
      tracingList.parse((await visitor.get(`/api/jobs/${tracing.jobId}/tracings`)).json()).tracings.map(({ id }) => id);
    expectStatus(await visitor.patch(`/api/tracings/${tracing.id}`, { removed: true }), 200);
    expect(await ids()).toEqual([]);
    expectStatus(await visitor.patch(`/api/tracings/${tracing.id}`, { removed: false }), 200);
    expect(await ids()).toEqual([tracing.id]);
  });

  it('When it is larger than what is read, then it is refused with the limit and not kept', async () => {
    const answer = await upload(new Uint8Array(LIMITS.drawingBytes + 1), 'huge.dxf');
    const body = errorBody.parse(expectStatus(answer, 413).json());
    expect(body).toMatchObject({ code: 'too-large' });
    expect(body.message).toContain('huge.dxf is larger than 32 MB');
  });

  it('When the form has no file, or another field, then that is said by name', async () => {
    const { id: jobId } = await addJob(visitor);
    const none = await visitor.send('POST', `/api/jobs/${jobId}/tracings`, { body: new FormData() });
    expect(errorBody.parse(expectStatus(none, 400).json()).fields).toMatchObject([{ path: 'file' }]);
    expect((await upload(frameDrawing(), 'a.dxf', 'drawing')).status).toBe(400);
  });
});

describe('Reading a drawing', () => {
  it('When it has a frame, then perimeter and opening come as loops with those roles', async () => {
    const read = await reading(await uploaded(frameDrawing()));
    expect(read).toMatchObject({ fileUnit: 'in', unit: 'in', incomplete: false, segments: 8 });
    expect(read.loops.map(({ role }) => role)).toEqual(['perimeter', 'opening']);
    expect(read.loops[1]!.vertices.map(([x, y]) => `${x} ${y}`).sort()).toEqual([
      '102 53',
      '102 77',
      '118 53',
      '118 77',
    ]);
    expect(read.found).toHaveLength(8 * 5);
    expect(read.census).toEqual([expect.objectContaining({ type: 'LINE', layer: 'FRAME', fate: 'kept', count: 8 })]);
  });

  it('When it says no unit, then nothing is healed until one is chosen', async () => {
    const tracing = await uploaded(frameDrawing(null));
    const before = await reading(tracing);
    expect(before).toMatchObject({ fileUnit: null, unit: null, loops: [], counts: null });
    // Its size, for the question: inches or millimetres?
    const { minX, minY, maxX, maxY } = before.extents!;
    expect([maxX - minX, maxY - minY]).toEqual([20, 30]);
    expect((await reading(tracing, { unit: 'mm' })).loops).toHaveLength(2);
  });

  it.each([
    ['a PDF', '%PDF-1.7\n', 'is-pdf'],
    ['nothing', '', 'empty-file'],
    ['a picture of vectors', '<svg xmlns="http://www.w3.org/2000/svg"/>', 'is-svg'],
  ])('When the file is %s, then it says so and what to export instead', async (_, content, reason) => {
    const tracing = await uploaded(content);
    const answer = await ask(tracing);
    expect(await refusedFor(tracing, answer)).toBe(reason);
  });

  it('When the options are not that, then each wrong one is named', async () => {
    const tracing = await uploaded(frameDrawing());
    const answer = await ask(tracing, { gap: 4, unit: 'ft' as 'in' });
    const { fields } = errorBody.parse(expectStatus(answer, 400).json());
    expect(fields!.map(({ path }) => path).sort()).toEqual(['options.gap', 'options.unit']);
  });

  it('When one drawing takes its time, then others are answered meanwhile', async () => {
    // Crossing lines by the thousand: the most work there is for its bytes.
    const lines: (string | number)[] = [];
    for (let i = 0; i < 20_000; i++) lines.push(0, 'LINE', 8, '0', 10, i % 100, 20, i, 11, i, 21, i % 77);
    const tracing = await uploaded(drawing(lines));
    let done = false;
    const slow = ask(tracing).then((answer) => ((done = true), answer));
    let answered = 0;
    while (!done && answered < 50) {
      expectStatus(await visitor.get('/api/session'), 200);
      answered++;
    }
    expect(answered).toBeGreaterThan(1);
    expect([200, 413, 422]).toContain((await slow).status);
  });
});

describe('Frames from a drawing', () => {
  it('When roles are given, then a frame is there, moved to 0, 0, and knows its drawing', async () => {
    const tracing = await uploaded(frameDrawing());
    const { frames } = tracedFramesAdded.parse(expectStatus(await addFrames(tracing), 201).json());
    expect(frames).toEqual([{ id: expect.any(String), name: 'Sink base' }]);
    const frame = frameContract.parse((await visitor.get(`/api/frames/${frames[0]!.id}`)).json());
    expect(frame.tracing).toEqual({ id: tracing.id, fileName: tracing.fileName });
    expect(frame.particulars).toMatchObject({ name: 'Sink base', unit: 'in', dados: [] });
    const { outline } = frame.particulars;
    if (outline.kind !== 'traced') throw new Error('the outline is to be traced');
    expect(outline.perimeter.map(([x, y]) => `${x} ${y}`).sort()).toEqual(['0 0', '0 30', '20 0', '20 30']);
    const after = tracingContract.parse((await visitor.get(`/api/tracings/${tracing.id}`)).json());
    expect(after.frames).toEqual(frames);
  });

  it('When it is wanted as members, then stiles and rails are what was drawn', async () => {
    const tracing = await uploaded(frameDrawing());
    const answer = await addFrames(tracing, { frames: [{ name: 'Sink base', asMembers: true }] });
    const [{ id } = { id: '' }] = tracedFramesAdded.parse(expectStatus(answer, 201).json()).frames;
    const { particulars } = frameContract.parse((await visitor.get(`/api/frames/${id}`)).json());
    expect(particulars.outline).toMatchObject({
      kind: 'members',
      width: 20,
      height: 30,
      stiles: { left: 2, right: 2 },
      rails: { top: 3, bottom: 3 },
      feet: 0,
    });
  });

  it.each([
    { ends: 'inside the frame', from: 1, to: 29, said: ['meets', 'meets'] },
    { ends: 'on the frame’s edges', from: 0, to: 30, said: ['open', 'open'] },
  ])('When a rectangle that ends $ends is said to be a dado, then it is one, as drawn', async ({ from, to, said }) => {
    const text = drawing([
      ...rectangleLines(0, 0, 20, 30),
      ...rectangleLines(2, 3, 18, 27),
      ...rectangleLines(0.25, from, 1, to),
    ]);
    const tracing = await uploaded(text);
    const { loops } = await reading(tracing);
    const sizes = loops.map(({ vertices }) => {
      const xs = vertices.map(([x]) => x);
      return Math.max(...xs) - Math.min(...xs);
    });
    // Along the frame's edge the rectangle cuts the frame into cells: what is no part of it is left out.
    const roles = sizes.map((width) =>
      width === 20 ? 'perimeter' : width === 16 ? 'opening' : width === 0.75 ? 'dado' : 'leave-out',
    );
    const answer = await addFrames(tracing, { roles });
    const [{ id } = { id: '' }] = tracedFramesAdded.parse(expectStatus(answer, 201).json()).frames;
    const { particulars } = frameContract.parse((await visitor.get(`/api/frames/${id}`)).json());
    expect(particulars.dados).toMatchObject([
      { runs: 'vertical', at: 0.25, panel: 0.75, clearance: 0, from, to, ends: said },
    ]);
  });

  it('When roles or names are of another reading, then nothing is added', async () => {
    const tracing = await uploaded(frameDrawing());
    expect(await refusedFor(tracing, await addFrames(tracing, { roles: ['perimeter'] }))).toBe('other-reading');
    const two = [
      { name: 'One', asMembers: false },
      { name: 'Two', asMembers: false },
    ];
    expect(await refusedFor(tracing, await addFrames(tracing, { frames: two }))).toBe('other-reading');
  });

  it('When the unit is not known, or the end is missing and not confirmed, then nothing is added', async () => {
    const unitless = await uploaded(frameDrawing(null));
    expect(await refusedFor(unitless, await addFrames(unitless))).toBe('unit-unknown');
    const cut = await uploaded(frameDrawing().replace('0\nENDSEC\n0\nEOF\n', ''));
    expect(await refusedFor(cut, await addFrames(cut))).toBe('not-confirmed');
    expectStatus(await addFrames(cut, { confirmed: true }), 201);
  });

  it('When one of several frames cannot be made of members, then none is added', async () => {
    const triangle = [0, 'LWPOLYLINE', 8, '0', 90, 3, 70, 1, 10, 203, 20, 3, 10, 217, 20, 3, 10, 210, 20, 20];
    const text = drawing([
      ...rectangleLines(0, 0, 20, 30),
      ...rectangleLines(2, 3, 18, 27),
      ...rectangleLines(200, 0, 220, 30),
      ...triangle,
    ]);
    const tracing = await uploaded(text);
    const { loops } = await reading(tracing);
    const answer = await addFrames(tracing, {
      roles: loops.map(({ role }) => role),
      frames: [
        { name: 'Plain', asMembers: true },
        { name: 'Gable', asMembers: true },
      ],
    });
    expect(errorBody.parse(answer.json()).message).toMatch(/^Gable: Opening A/);
    expect(await refusedFor(tracing, answer)).toBe('no-members');
  });
});
