import type { FrameFilesTaken } from '#shared/contracts/frames.ts';
import { LIMITS } from '#shared/contracts/limits.ts';
import { parseFrameFile } from '#shared/contracts/parse-frame-file.ts';
import type { ReadFrameFile } from '#shared/contracts/parse-frame-file.ts';
import { wrongField } from '../../errors.ts';
import type { SignedIn } from '../../http/signed-in.ts';
import type { UploadedFile } from '../../http/take-files.ts';
import type { FramesService } from './frames.service.ts';

function read({ bytes }: UploadedFile): ReadFrameFile {
  if (bytes === null)
    return { ok: false, message: `too large: takes at most ${LIMITS.frameFileBytes} bytes`, fields: [] };
  if (bytes.length === 0) return { ok: false, message: 'the file is empty', fields: [] };
  try {
    return parseFrameFile(new TextDecoder('utf-8', { fatal: true }).decode(bytes));
  } catch {
    return { ok: false, message: 'not a frame file: it is not text in UTF-8', fields: [] };
  }
}

/** Adds a frame for each good file, in the order sent; bad ones come back by name with what is wrong. Throws when there is no file. */
export async function takeFrameFiles(
  frames: FramesService,
  who: SignedIn,
  jobId: string,
  files: readonly UploadedFile[],
): Promise<FrameFilesTaken> {
  if (files.length === 0) throw wrongField('files', 'nothing', 'one or more frame files');
  const answer: FrameFilesTaken = { taken: [], refused: [] };
  for (const file of files) {
    const result = read(file);
    if (result.ok) {
      const frame = await frames.add(who, jobId, result.particulars);
      answer.taken.push({ file: file.name, frameId: frame.id, name: frame.particulars.name });
    } else {
      answer.refused.push({ file: file.name, message: result.message, fields: result.fields });
    }
  }
  return answer;
}
