import { writeFrameFile } from '#shared/contracts/write-frame-file.ts';
import { BUILTIN_PROFILES } from '#shared/kernel/profiles/builtin-profiles.ts';
import type { FileProfile } from '#shared/kernel/profiles/file-profile.ts';
import { AppError, notFound } from '../../errors.ts';
import type { LayerSetInput } from '../../layer-set/layer-set.ts';
import { safeName } from '../../layer-set/safe-name.ts';
import type { MadeFile, Makers } from '../../making/tasks.ts';
import { frozenParticulars } from '../../revisions/frozen-particulars.ts';
import type { DownloadsStore, StoredRevision } from './downloads.store.ts';

export type DownloadsService = ReturnType<typeof downloadsService>;

/** How the shop wants its files: its paper, and the profile asked for or its default. */
interface Wanted {
  readonly shopName: string;
  readonly paper: LayerSetInput['paper'];
  readonly profile: FileProfile;
}

const setInput = (row: StoredRevision, { paper, profile }: Wanted): LayerSetInput => ({
  particulars: frozenParticulars(row),
  shopName: row.shopName,
  jobName: row.jobName,
  revision: row.letter,
  author: row.author,
  releasedAt: row.releasedAt.toISOString(),
  note: row.note,
  profile,
  paper,
});

/** Files to take away. */
export function downloadsService(store: DownloadsStore, makers: Makers) {
  async function wanted(shopId: string, profileId: string | undefined): Promise<Wanted> {
    const shop = await store.shopPapers(shopId);
    const id = profileId ?? shop.defaultProfileId;
    const profile = BUILTIN_PROFILES.find((p) => p.id === id)?.profile ?? (await store.findProfile(shopId, id));
    if (!profile) throw notFound('profile');
    return { shopName: shop.name, paper: shop.paper, profile };
  }

  async function mustFind(shopId: string, frameId: string, letter: string): Promise<StoredRevision> {
    const row = await store.findRevision(shopId, frameId, letter);
    if (!row) throw notFound('revision');
    return row;
  }

  async function mustFindDraft(shopId: string, frameId: string) {
    const draft = await store.findDraft(shopId, frameId);
    if (!draft) throw notFound('frame');
    return draft;
  }

  return {
    async layerSet(
      shopId: string,
      frameId: string,
      letter: string,
      profileId: string | undefined,
      signal: AbortSignal,
    ): Promise<MadeFile> {
      const row = await mustFind(shopId, frameId, letter);
      return makers.make('layer-set', setInput(row, await wanted(shopId, profileId)), signal);
    },

    async setupSheet(
      shopId: string,
      frameId: string,
      letter: string,
      profileId: string | undefined,
      signal: AbortSignal,
    ): Promise<MadeFile> {
      const row = await mustFind(shopId, frameId, letter);
      return makers.make('setup-sheet', setInput(row, await wanted(shopId, profileId)), signal);
    },

    /** The very bytes that were released. */
    async frameFile(shopId: string, frameId: string, letter: string): Promise<MadeFile> {
      const row = await mustFind(shopId, frameId, letter);
      const { name } = frozenParticulars(row);
      return { name: `${safeName(name, 'frame')}_rev-${row.letter}.frame.json`, bytes: row.file };
    },

    async draftSheet(
      shopId: string,
      frameId: string,
      profileId: string | undefined,
      signal: AbortSignal,
    ): Promise<MadeFile> {
      const draft = await mustFindDraft(shopId, frameId);
      const { shopName, paper, profile } = await wanted(shopId, profileId);
      const { particulars, jobName, changedBy: author } = draft;
      return makers.make(
        'draft-sheet',
        { particulars, shopName, jobName, author, changedAt: draft.changedAt.toISOString(), profile, paper },
        signal,
      );
    },

    async draftFrameFile(shopId: string, frameId: string): Promise<MadeFile> {
      const { particulars } = await mustFindDraft(shopId, frameId);
      return {
        name: `${safeName(particulars.name, 'frame')}_draft.frame.json`,
        bytes: new TextEncoder().encode(writeFrameFile(particulars)),
      };
    },

    /** Throws 'not-found' also when no frame of the job has a revision. */
    async jobSet(shopId: string, jobId: string, profileId: string | undefined, signal: AbortSignal): Promise<MadeFile> {
      const job = await store.findJob(shopId, jobId);
      if (!job) throw notFound('job');
      const rows = await store.newestRevisions(shopId, jobId);
      if (rows.length === 0) {
        throw new AppError('not-found', `job ${jobId} has no revision`, {
          message: 'No frame of this job has been released yet.',
        });
      }
      const how = await wanted(shopId, profileId);
      const sets = rows.map((row) => setInput(row, how));
      const leftOut = await store.unreleased(shopId, jobId);
      return makers.make(
        'job-set',
        { jobName: job.name, shopName: how.shopName, paper: how.paper, sets, leftOut },
        signal,
      );
    },
  };
}
