import type { Request, RequestHandler } from 'express';
import multer from 'multer';
import { LIMITS } from '#shared/contracts/limits.ts';
import { AppError, wrongField } from '../errors.ts';
import type { FileStore, KeptFile } from '../files/file-store.ts';

/** A drawing that was uploaded, kept in the file store. */
export interface TakenDrawing extends KeptFile {
  /** As the person's machine calls it. */
  readonly name: string;
}

const MB = 1024 * 1024;

/** Streams an upload into the file store: no drawing is ever held whole in memory by the thread that answers requests. */
const intoStore = (files: FileStore): multer.StorageEngine => ({
  _handleFile(_req, file, done) {
    files.keep(file.stream, LIMITS.drawingBytes).then(
      (kept) => {
        if (kept) return done(null, { size: kept.bytes, filename: kept.sha256 });
        const message = `${file.originalname} is larger than ${LIMITS.drawingBytes / MB} MB, the most that is read. Export only what belongs to the frames.`;
        done(new AppError('too-large', `${file.originalname} is too large`, { message }));
      },
      (error: unknown) => done(error),
    );
  },
  _removeFile(_req, _file, done) {
    // The same file may be another tracing's.
    done(null);
  },
});

/** An error of taking a form, told by the field. What the disk says is no fault of the form. */
function asFormError(error: Error & { readonly code?: string }, field: string): Error {
  if (error instanceof AppError) return error;
  const takes = `one file in the field "${field}", as whole multipart form data`;
  if (error instanceof multer.MulterError) return wrongField(error.field ?? field, error.message, takes);
  return error.code === undefined ? wrongField(field, error.message, takes) : error;
}

/** Takes one drawing from the form field `field` into the store. A form that cannot be read is 'invalid-input'. */
export function takeDrawing(files: FileStore, field: string): RequestHandler {
  const upload = multer({
    storage: intoStore(files),
    defParamCharset: 'utf8',
    limits: { files: 1, fields: 0, parts: 1, fileSize: 2 * LIMITS.drawingBytes, headerPairs: 20 },
  });
  const take = upload.single(field);
  return (req, res, next) => {
    take(req, res, (error: unknown) => {
      next(error instanceof Error ? asFormError(error, field) : error);
    });
  };
}

/** What takeDrawing took. Throws 'invalid-input' when that is nothing. */
export function takenDrawing(req: Request, field: string): TakenDrawing {
  const { file } = req;
  if (!file) throw wrongField(field, 'nothing', 'one drawing');
  return { name: file.originalname, sha256: file.filename, bytes: file.size };
}
