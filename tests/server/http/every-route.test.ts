import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { role as roles, type Role } from '../../../shared/contracts/roles.ts';
import { BUILTIN_PROFILES } from '../../../shared/kernel/profiles/builtin-profiles.ts';
import { writeFrameFile } from '../../../shared/contracts/write-frame-file.ts';
import { PLAIN_TRACE } from '../../../shared/kernel/tracing/traced-drawing.ts';
import { frameDrawing } from '../../builders/drawings.ts';
import { addMail } from '../../builders/mails.ts';
import { aFrame } from '../../builders/particulars.ts';
import {
  addFrame,
  addJob,
  addPerson,
  anAddress,
  expectStatus,
  openShop,
  releaseFrame,
  type SignedInVisitor,
} from '../../builders/shops.ts';
import type { HttpClient } from '../../setup/http-client.ts';
import { listRoutes } from '../../setup/list-routes.ts';
import { allowSlowMachine } from '../../setup/slow-machine.ts';
import { startTestServer, type TestServer } from '../../setup/test-server.ts';

allowSlowMachine();

/** Things of a shop that paths and bodies may name. Requests that change something get a fresh set, so that none spoils the next. */
interface Things {
  readonly jobId: string;
  readonly frameId: string;
  readonly profileId: string;
  readonly cutterId: string;
  readonly presetId: string;
  readonly tracingId: string;
  readonly personId: string;
  readonly invitationId: string;
  readonly mailId: string;
}

interface Row {
  /** Who may: anybody, anybody signed in, or these roles. */
  readonly who: 'anybody' | 'signed in' | readonly Role[];
  /** Status for those who may, with the shop's own things. */
  readonly answers: number;
  readonly body?: (things: Things) => unknown;
  readonly query?: (things: Things) => string;
  /** Names nothing of a shop, so there is nothing of another shop to ask for. */
  readonly nobodys?: true;
}

const EDITORS: readonly Role[] = ['owner', 'designer'];
const PROFILE_EDITORS: readonly Role[] = ['owner', 'programmer'];
const CUTTER_EDITORS: readonly Role[] = ['owner', 'programmer'];

let names = 0;
const aProfile = () => ({ ...BUILTIN_PROFILES[0]!.profile, name: `Profile ${++names}` });
const aCutter = () => ({
  unit: 'in',
  cutter: { kind: 'straight', name: `Cutter ${++names}`, diameter: 0.25, fluteLength: 1 },
});
const anEdge = () => ({
  name: `Edge ${++names}`,
  unit: 'in',
  edge: { style: 'square', sizeHeldAt: 'face' },
  cutters: {},
});
const anInvitation = () => ({ email: anAddress(), role: 'designer' });
const aCutterFile = () => {
  const form = new FormData();
  form.append(
    'file',
    new Blob([`name,unit,kind,diameter,flute length\nCutter ${++names},in,straight,0.25,1\n`]),
    'a.csv',
  );
  return form;
};
const aFileForm = () => {
  const form = new FormData();
  form.append('files', new Blob([writeFrameFile(aFrame())]), 'a.frame.json');
  return form;
};
const aDrawing = () => {
  const form = new FormData();
  form.append('file', new Blob([frameDrawing()]), 'a.dxf');
  return form;
};
const tracedFrames = () => ({
  options: PLAIN_TRACE,
  confirmed: false,
  roles: ['perimeter', 'opening'],
  frames: [{ name: 'Traced', asMembers: true }],
});
const ofProfile = ({ profileId }: Things) => `?profile=${profileId}`;

// A route that is missing here fails the first test. The spec's table of who may do what stands in shared/contracts/roles.ts;
// it is written out once more here, so that a slip in either shows.
const TABLE: Record<string, Row> = {
  'GET /healthz': { who: 'anybody', answers: 200, nobodys: true },
  'GET /api/session': { who: 'anybody', answers: 200, nobodys: true },
  'POST /api/sign-up': { who: 'anybody', answers: 400, nobodys: true, body: () => ({}) },
  'POST /api/sign-in': { who: 'anybody', answers: 400, nobodys: true, body: () => ({}) },
  'POST /api/demo-sign-in': { who: 'anybody', answers: 404, nobodys: true, body: () => ({}) },
  'POST /api/sign-out': { who: 'anybody', answers: 204, nobodys: true },
  'POST /api/sign-out-everywhere': { who: 'signed in', answers: 204, nobodys: true },
  'POST /api/forgot-password': { who: 'anybody', answers: 400, nobodys: true, body: () => ({}) },
  'POST /api/reset-password': { who: 'anybody', answers: 400, nobodys: true, body: () => ({}) },
  'GET /api/people': { who: ['owner'], answers: 200, nobodys: true },
  'PATCH /api/people/:personId': { who: ['owner'], answers: 204, body: () => ({ role: 'programmer' }) },
  'POST /api/invitations': { who: ['owner'], answers: 201, nobodys: true, body: anInvitation },
  'POST /api/invitations/:invitationId/resend': { who: ['owner'], answers: 200 },
  'DELETE /api/invitations/:invitationId': { who: ['owner'], answers: 204 },
  'GET /api/join/:token': { who: 'anybody', answers: 404, nobodys: true },
  'POST /api/join': { who: 'anybody', answers: 400, nobodys: true, body: () => ({}) },
  'PATCH /api/shop': { who: ['owner'], answers: 200, body: ({ profileId }) => ({ defaultProfileId: profileId }) },
  'GET /api/outbox': { who: ['owner'], answers: 200, nobodys: true },
  'GET /api/outbox/:mailId': { who: ['owner'], answers: 200 },
  'GET /api/profiles': { who: 'signed in', answers: 200, nobodys: true },
  'POST /api/profiles': { who: PROFILE_EDITORS, answers: 201, nobodys: true, body: aProfile },
  'PUT /api/profiles/:profileId': { who: PROFILE_EDITORS, answers: 200, body: aProfile },
  'DELETE /api/profiles/:profileId': { who: PROFILE_EDITORS, answers: 204 },
  'GET /api/cutters': { who: 'signed in', answers: 200, nobodys: true },
  'GET /api/cutters/csv': { who: 'signed in', answers: 200, nobodys: true },
  'POST /api/cutters': { who: CUTTER_EDITORS, answers: 201, nobodys: true, body: aCutter },
  'POST /api/cutters/csv': { who: CUTTER_EDITORS, answers: 200, nobodys: true, body: aCutterFile },
  'PUT /api/cutters/:cutterId': { who: CUTTER_EDITORS, answers: 200, body: aCutter },
  'DELETE /api/cutters/:cutterId': { who: CUTTER_EDITORS, answers: 200 },
  'GET /api/edge-presets': { who: 'signed in', answers: 200, nobodys: true },
  'POST /api/edge-presets': { who: EDITORS, answers: 201, nobodys: true, body: anEdge },
  'DELETE /api/edge-presets/:presetId': { who: EDITORS, answers: 204 },
  'GET /api/jobs': { who: 'signed in', answers: 200, nobodys: true },
  'POST /api/jobs': { who: EDITORS, answers: 201, nobodys: true, body: () => ({ name: 'Another job' }) },
  'GET /api/jobs/:jobId': { who: 'signed in', answers: 200 },
  'PATCH /api/jobs/:jobId': { who: EDITORS, answers: 200, body: () => ({ name: 'Renamed' }) },
  'POST /api/jobs/:jobId/frames': { who: EDITORS, answers: 201, body: () => ({ particulars: aFrame() }) },
  'POST /api/jobs/:jobId/frame-files': { who: EDITORS, answers: 200, body: aFileForm },
  'POST /api/jobs/:jobId/frame-table': { who: EDITORS, answers: 201, body: () => ({ frames: [aFrame()] }) },
  'GET /api/jobs/:jobId/frames.csv': { who: 'signed in', answers: 200 },
  'GET /api/jobs/:jobId/layer-sets.zip': { who: 'signed in', answers: 200, query: ofProfile },
  'GET /api/jobs/:jobId/tracings': { who: 'signed in', answers: 200 },
  'POST /api/jobs/:jobId/tracings': { who: EDITORS, answers: 201, body: aDrawing },
  'GET /api/tracings/:tracingId': { who: 'signed in', answers: 200 },
  'PATCH /api/tracings/:tracingId': { who: EDITORS, answers: 200, body: () => ({ removed: true }) },
  'GET /api/tracings/:tracingId/file': { who: 'signed in', answers: 200 },
  'POST /api/tracings/:tracingId/reading': { who: 'signed in', answers: 200, body: () => ({ options: PLAIN_TRACE }) },
  'POST /api/tracings/:tracingId/frames': { who: EDITORS, answers: 201, body: tracedFrames },
  'GET /api/frames/:frameId': { who: 'signed in', answers: 200 },
  'PATCH /api/frames/:frameId': { who: EDITORS, answers: 200, body: () => ({ removed: true }) },
  'PUT /api/frames/:frameId/draft': {
    who: EDITORS,
    answers: 200,
    body: () => ({ version: 1, particulars: aFrame({ 'outline.width': 34 }) }),
  },
  'GET /api/frames/:frameId/draft/frame-file': { who: 'signed in', answers: 200 },
  'GET /api/frames/:frameId/draft/setup-sheet.pdf': { who: 'signed in', answers: 200, query: ofProfile },
  'POST /api/frames/:frameId/revisions': { who: EDITORS, answers: 201, body: () => ({ version: 1 }) },
  'GET /api/frames/:frameId/revisions/:letter': { who: 'signed in', answers: 200 },
  'GET /api/frames/:frameId/revisions/:letter/frame-file': { who: 'signed in', answers: 200 },
  'GET /api/frames/:frameId/revisions/:letter/layer-set.zip': { who: 'signed in', answers: 200, query: ofProfile },
  'GET /api/frames/:frameId/revisions/:letter/setup-sheet.pdf': { who: 'signed in', answers: 200, query: ofProfile },
};
const ROWS = Object.entries(TABLE);
const isOpen = ([, row]: [string, Row]) => row.who === 'anybody';

let server: TestServer;
let mine: SignedInVisitor;
let theirs: SignedInVisitor;
let theirThings: Things;
let myThings: Things;
const people = new Map<Role, HttpClient>();

async function things({ visitor, session }: SignedInVisitor, released: boolean): Promise<Things> {
  const job = await addJob(visitor);
  const frame = await addFrame(visitor, job.id);
  if (released) await releaseFrame(visitor, frame);
  const profile = expectStatus(await visitor.post('/api/profiles', aProfile()), 201).json<{ id: string }>();
  const cutter = expectStatus(await visitor.post('/api/cutters', aCutter()), 201).json<{ id: string }>();
  const preset = expectStatus(await visitor.post('/api/edge-presets', anEdge()), 201).json<{ id: string }>();
  const drawing = await visitor.send('POST', `/api/jobs/${job.id}/tracings`, { body: aDrawing() });
  const tracing = expectStatus(drawing, 201).json<{ id: string }>();
  const invitation = expectStatus(await visitor.post('/api/invitations', anInvitation()), 201).json<{ id: string }>();
  return {
    jobId: job.id,
    frameId: frame.id,
    profileId: profile.id,
    cutterId: cutter.id,
    presetId: preset.id,
    tracingId: tracing.id,
    personId: (await addPerson(server, session.shop.id, 'operator')).session.user.id,
    invitationId: invitation.id,
    mailId: await addMail(server, session.shop.id),
  };
}

const thingsFor = async (route: string): Promise<Things> => (route.startsWith('GET') ? myThings : things(mine, false));

const ask = (visitor: HttpClient, route: string, row: Row, named: Things, queried = named) => {
  const [method = '', pattern = ''] = route.split(' ');
  const path = pattern
    .replace(':jobId', named.jobId)
    .replace(':frameId', named.frameId)
    .replace(':profileId', named.profileId)
    .replace(':cutterId', named.cutterId)
    .replace(':presetId', named.presetId)
    .replace(':tracingId', named.tracingId)
    .replace(':mailId', named.mailId)
    .replace(':personId', named.personId)
    .replace(':invitationId', named.invitationId)
    .replace(':token', 'no-such-link')
    .replace(':letter', 'A');
  return visitor.send(method, `${path}${row.query?.(queried) ?? ''}`, { body: row.body?.(named) });
};

beforeAll(async () => {
  server = await startTestServer();
  mine = await openShop(server, { shopName: 'Mine' });
  theirs = await openShop(server, { shopName: 'Theirs' });
  theirThings = await things(theirs, true);
  myThings = await things(mine, true);
  people.set('owner', mine.visitor);
  for (const role of roles.options)
    if (role !== 'owner') people.set(role, (await addPerson(server, mine.session.shop.id, role)).visitor);
});
afterAll(() => server.close());

describe('Every route', () => {
  it('When the routes are listed, then each one stands in the table of this test, and no other', () => {
    expect(listRoutes(server.app)).toEqual(ROWS.map(([route]) => route).sort());
  });

  it.each(ROWS.filter((r) => !isOpen(r)))('When nobody is signed in, then %s answers 401', async (route, row) => {
    const answer = await ask(server.visitor(), route, row, theirThings);
    expect(answer.status).toBe(401);
    expect(answer.json().code).toBe('not-signed-in');
  });

  it.each(ROWS.filter(([, row]) => !row.nobodys))(
    'When an id is of another shop, then %s answers 404 and changes nothing',
    async (route, row) => {
      const before = (await theirs.visitor.get(`/api/jobs/${theirThings.jobId}`)).json();
      const answer = await ask(mine.visitor, route, row, theirThings);
      expect(answer.status).toBe(404);
      expect(answer.json()).toEqual({
        code: 'not-found',
        message: 'There is nothing here, or it is not yours to see.',
      });
      expect((await theirs.visitor.get(`/api/jobs/${theirThings.jobId}`)).json()).toEqual(before);
    },
  );

  it.each(ROWS.filter(([, row]) => row.query))(
    "When only the profile is another shop's, then %s answers 404",
    async (route, row) => {
      const answer = await ask(mine.visitor, route, row, myThings, theirThings);
      expect(answer.status).toBe(404);
    },
  );

  describe.each(roles.options)('When a person is %s', (role) => {
    it.each(ROWS.filter((r) => !isOpen(r) && r[0] !== 'POST /api/sign-out-everywhere'))(
      'then %s lets in or answers 403, as the table says',
      async (route, row) => {
        const allowed = row.who === 'signed in' || row.who.includes(role);
        const answer = await ask(people.get(role)!, route, row, await thingsFor(route));
        expect(answer.status).toBe(allowed ? row.answers : 403);
        if (!allowed) expect(answer.json().code).toBe('not-allowed');
      },
    );
  });

  it.each(ROWS.filter(isOpen))('When nobody is signed in, then %s answers as the table says', async (route, row) => {
    expect((await ask(server.visitor(), route, row, theirThings)).status).toBe(row.answers);
  });

  it('When a person signs out everywhere, then the table holds for that too', async () => {
    const { visitor } = await addPerson(server, mine.session.shop.id, 'operator');
    expect(
      (await ask(visitor, 'POST /api/sign-out-everywhere', TABLE['POST /api/sign-out-everywhere']!, theirThings))
        .status,
    ).toBe(204);
  });
});
