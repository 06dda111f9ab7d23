import { randomUUID } from 'node:crypto';
import type { Frame } from '../../shared/contracts/frames.ts';
import type { Job } from '../../shared/contracts/jobs.ts';
import type { Role } from '../../shared/contracts/roles.ts';
import type { Session } from '../../shared/contracts/session.ts';
import type { Particulars } from '../../shared/kernel/particulars/particulars.ts';
import { users } from '../../server/db/schema.ts';
import { hashPassword } from '../../server/features/session/hash-password.ts';
import type { Answer, HttpClient } from '../setup/http-client.ts';
import type { TestServer } from '../setup/test-server.ts';
import { aFrame } from './particulars.ts';

export const PASSWORD = 'correct horse battery';

let count = 0;
/** An address that no other test of the file has. */
export const anAddress = (): string => `person-${++count}@shop.example`;

/** The answer, once its status is the expected one; the body is in the message otherwise. */
export function expectStatus(answer: Answer, status: number): Answer {
  if (answer.status !== status)
    throw new Error(`status ${answer.status}, expected ${status}: ${new TextDecoder().decode(answer.bytes)}`);
  return answer;
}

export interface SignedInVisitor {
  readonly visitor: HttpClient;
  readonly session: Session & { user: NonNullable<Session['user']>; shop: NonNullable<Session['shop']> };
}

/** A new shop; the visitor is signed in as its owner. */
export async function openShop(
  server: TestServer,
  given: { shopName?: string; name?: string; email?: string; unit?: 'in' | 'mm' } = {},
): Promise<SignedInVisitor> {
  const visitor = server.visitor();
  const answer = await visitor.post('/api/sign-up', {
    shopName: 'Shop',
    name: 'Owner',
    email: anAddress(),
    password: PASSWORD,
    ...given,
  });
  return { visitor, session: expectStatus(answer, 201).json<SignedInVisitor['session']>() };
}

/** One more person of a shop, signed in. The row is written directly: joining by an invitation is a test of its own. */
export async function addPerson(
  server: TestServer,
  shopId: string,
  role: Role,
  name = `The ${role}`,
): Promise<SignedInVisitor> {
  const email = anAddress();
  const passwordHash = await hashPassword(PASSWORD);
  await server.database.queries
    .insert(users)
    .values({ id: randomUUID(), shopId, role, name, email, passwordHash, createdAt: new Date(0) });
  const visitor = server.visitor();
  const answer = await visitor.post('/api/sign-in', { email, password: PASSWORD });
  return { visitor, session: expectStatus(answer, 200).json<SignedInVisitor['session']>() };
}

export const addJob = async (visitor: HttpClient, name = 'Job'): Promise<Job> =>
  expectStatus(await visitor.post('/api/jobs', { name }), 201).json<Job>();

export const addFrame = async (
  visitor: HttpClient,
  jobId: string,
  particulars: Particulars = aFrame(),
): Promise<Frame> => expectStatus(await visitor.post(`/api/jobs/${jobId}/frames`, { particulars }), 201).json<Frame>();

/** Releases a frame's draft, whatever cautions it has. */
export async function releaseFrame(
  visitor: HttpClient,
  frame: Pick<Frame, 'id' | 'version'>,
  acknowledged: string[] = [],
): Promise<Frame> {
  const answer = await visitor.post(`/api/frames/${frame.id}/revisions`, {
    version: frame.version,
    note: 'First issue',
    acknowledged,
  });
  return expectStatus(answer, 201).json<Frame>();
}

/** A shop whose owner has a job with one frame. */
export async function openShopWithFrame(server: TestServer, particulars: Particulars = aFrame()) {
  const { visitor, session } = await openShop(server);
  const job = await addJob(visitor);
  return { visitor, session, job, frame: await addFrame(visitor, job.id, particulars) };
}
