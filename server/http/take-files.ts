import type { Request, RequestHandler } from 'express';
import multer from 'multer';
import { LIMITS } from '#shared/contracts/limits.ts';
import { wrongField } from '../errors.ts';

/** A file of an upload, held in memory. */
export interface UploadedFile {
  readonly name: string;
  /** null: longer than allowed, and not kept. */
  readonly bytes: Buffer | null;
}

/**
 * Keeps files in memory, each up to the limit; of a longer one only the name, so that it can be refused by name
 * while the others of the same upload are taken.
 */
const inMemory: multer.StorageEngine = {
  _handleFile(_req, file, done) {
    let chunks: Buffer[] = [];
    let length = 0;
    file.stream.on('data', (chunk: Buffer) => {
      length += chunk.length;
      if (length > LIMITS.frameFileBytes) chunks = [];
      else chunks.push(chunk);
    });
    file.stream.on('error', (error) => done(error));
    file.stream.on('end', () => {
      const tooLong = length > LIMITS.frameFileBytes;
      done(null, tooLong ? { size: length } : { size: length, buffer: Buffer.concat(chunks) });
    });
  },
  _removeFile(_req, _file, done) {
    done(null);
  },
};

const upload = multer({
  storage: inMemory,
  defParamCharset: 'utf8',
  // fileSize only bounds what is read through; what is kept is bounded above.
  limits: {
    files: LIMITS.frameFilesAtOnce,
    fields: 0,
    parts: LIMITS.frameFilesAtOnce,
    fileSize: 32 * LIMITS.frameFileBytes,
    headerPairs: 20,
  },
});

/** Takes several files from the form field `field`. A form that cannot be read is 'invalid-input'. */
export function takeFiles(field: string): RequestHandler {
  const take = upload.array(field, LIMITS.frameFilesAtOnce);
  return (req, res, next) => {
    take(req, res, (error: unknown) => {
      // The reader of forms throws plain errors; whatever they say, the form is at fault.
      const unreadable = error instanceof Error && !(error instanceof multer.MulterError);
      next(unreadable ? wrongField(field, error.message, 'files, as whole multipart form data') : error);
    });
  };
}

/** What takeFiles took, in the order sent. */
export const takenFiles = (req: Request): UploadedFile[] =>
  ((req.files ?? []) as Express.Multer.File[]).map((file) => ({ name: file.originalname, bytes: file.buffer ?? null }));
