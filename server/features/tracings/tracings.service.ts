import { randomUUID } from 'node:crypto';
import type { Tracing, TracingList } from '#shared/contracts/tracings.ts';
import type { TraceFramesInput } from '#shared/kernel/tracing/trace-frames.ts';
import type { TraceOptions } from '#shared/kernel/tracing/traced-drawing.ts';
import { notFound } from '../../errors.ts';
import type { FileStore } from '../../files/file-store.ts';
import type { SignedIn } from '../../http/signed-in.ts';
import type { TakenDrawing } from '../../http/take-drawing.ts';
import type { MadeFile, Makers } from '../../making/tasks.ts';
import type { FramesService } from '../frames/frames.service.ts';
import type { TracingRow, TracingsStore } from './tracings.store.ts';

export type TracingsService = ReturnType<typeof tracingsService>;

interface TracingsGiven {
  readonly store: TracingsStore;
  readonly files: FileStore;
  readonly tracers: Makers;
  readonly frames: FramesService;
  readonly now: () => Date;
}

const present = (row: TracingRow, frames: Tracing['frames']): Tracing => ({
  id: row.id,
  jobId: row.jobId,
  jobName: row.jobName,
  fileName: row.fileName,
  bytes: row.bytes,
  sha256: row.sha256,
  uploadedBy: row.uploadedBy,
  uploadedAt: row.uploadedAt.toISOString(),
  removed: row.removed,
  frames,
});

/** Drawings that people upload to trace frames from. */
export function tracingsService({ store, files, tracers, frames, now }: TracingsGiven) {
  async function mustFind(shopId: string, tracingId: string): Promise<TracingRow> {
    const row = await store.find(shopId, tracingId);
    if (!row) throw notFound('tracing');
    return row;
  }

  async function withFrames(shopId: string, rows: readonly TracingRow[]): Promise<Tracing[]> {
    const made =
      rows.length === 0
        ? []
        : await store.framesOf(
            shopId,
            rows.map((row) => row.id),
          );
    const of = (id: string) =>
      made.filter((f) => f.tracingId === id).map((f) => ({ id: f.id, name: f.particulars.name }));
    return rows.map((row) => present(row, of(row.id)));
  }

  return {
    async list(shopId: string, jobId: string): Promise<TracingList> {
      if (!(await store.jobExists(shopId, jobId))) throw notFound('job');
      return { tracings: await withFrames(shopId, await store.listOf(shopId, jobId)) };
    },

    async read(shopId: string, tracingId: string): Promise<Tracing> {
      const [tracing] = await withFrames(shopId, [await mustFind(shopId, tracingId)]);
      return tracing!;
    },

    /** Throws 'not-found' before a file is taken in for a job that is not there. */
    async mustHaveJob(shopId: string, jobId: string): Promise<void> {
      if (!(await store.jobExists(shopId, jobId))) throw notFound('job');
    },

    async add(who: SignedIn, jobId: string, { name, bytes, sha256 }: TakenDrawing): Promise<Tracing> {
      const id = randomUUID();
      const uploaded = { uploadedBy: who.name, uploadedAt: now() };
      await store.add({ id, shopId: who.shopId, jobId, fileName: name, bytes, sha256, ...uploaded });
      return this.read(who.shopId, id);
    },

    async setRemoved(shopId: string, tracingId: string, removed: boolean): Promise<Tracing> {
      if (!(await store.setRemoved(shopId, tracingId, removed))) throw notFound('tracing');
      return this.read(shopId, tracingId);
    },

    /** The drawing as found and healed, as JSON: it may be large and is made where it holds up nobody. */
    async reading(shopId: string, tracingId: string, options: TraceOptions, signal: AbortSignal): Promise<string> {
      const { sha256 } = await mustFind(shopId, tracingId);
      return tracers.make('read-drawing', { bytes: await files.read(sha256), options }, signal);
    },

    async addFrames(who: SignedIn, tracingId: string, wanted: Omit<TraceFramesInput, 'bytes'>) {
      const { jobId, sha256 } = await mustFind(who.shopId, tracingId);
      const all = await tracers.make('trace-frames', { bytes: await files.read(sha256), ...wanted });
      return { frames: await frames.addAll(who, jobId, all, tracingId) };
    },

    /** The file as it was uploaded. */
    async file(shopId: string, tracingId: string): Promise<MadeFile> {
      const { fileName, sha256 } = await mustFind(shopId, tracingId);
      return { name: fileName, bytes: await files.read(sha256) };
    },
  };
}
