import { createHash, randomUUID } from 'node:crypto';
import type { Frame, releaseRequest } from '#shared/contracts/frames.ts';
import { writeFrameFile } from '#shared/contracts/write-frame-file.ts';
import { BUILTIN_PROFILES } from '#shared/kernel/profiles/builtin-profiles.ts';
import { nextLetter } from '#shared/kernel/revisions/next-letter.ts';
import type { z } from 'zod';
import { AppError } from '../../errors.ts';
import type { SignedIn } from '../../http/signed-in.ts';
import { workOut } from '../../making/work-out.ts';
import { checkRelease } from './check-release.ts';
import type { FramesGiven, FramesService } from './frames.service.ts';

export type ReleaseService = ReturnType<typeof releaseService>;

/** One built-in profile of each flavour: what a release must prove. */
const PROVED = (['R2007', 'R12'] as const).map(
  (flavour) => BUILTIN_PROFILES.find((p) => p.profile.flavour === flavour)!.profile,
);

/** Freezing a draft under the next letter. */
export const releaseService = ({ store, makers, now }: FramesGiven, frames: FramesService) => ({
  /** Throws 'stale-draft', 'nothing-changed', 'frame-has-stops', 'cautions-not-acknowledged' or 'proof-failed'; nothing is released then. */
  async release(who: SignedIn, frameId: string, request: z.output<typeof releaseRequest>): Promise<Frame> {
    const frame = await frames.mustFind(who.shopId, frameId);
    if (frame.version !== request.version) throw await frames.stale(frame, request.version, null);
    const { particulars } = frame;
    if (!(await frames.differsFromNewest(frame, particulars))) {
      throw new AppError('nothing-changed', `draft of ${frameId} is revision ${frame.letter}`, {
        message: `Nothing was changed since revision ${frame.letter}.`,
      });
    }
    checkRelease((await workOut(makers, particulars)).findings, request.acknowledged);

    const letter = nextLetter(frame.letter);
    const releasedAt = now();
    const file = new TextEncoder().encode(writeFrameFile(particulars));
    const proof = await makers.make('proof', { particulars, profiles: PROVED });
    if (!proof.ok) throw new AppError('proof-failed', `release of ${frameId}`, { details: { proof } });

    const revision = {
      id: randomUUID(),
      shopId: who.shopId,
      frameId,
      letter,
      note: request.note,
      author: who.name,
      jobName: frame.jobName,
      shopName: frame.shopName,
      releasedAt,
      authorId: who.id,
      acknowledged: request.acknowledged,
      file,
      sha256: createHash('sha256').update(file).digest('hex'),
    };
    // Somebody may have saved or released while the files were proved: then this looks again and says so.
    if (!(await store.release(revision, frame.version, frame.letter))) return this.release(who, frameId, request);
    return frames.read(who.shopId, frameId);
  },
});
