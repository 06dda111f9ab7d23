import type { Request, Response } from 'express';
import { contentDisposition } from './content-disposition.ts';
import type { MadeFile } from '../making/tasks.ts';

/** Sends a file under its name. `inline` lets the browser show it; a link's `download` attribute saves it all the same. */
export function sendFile(
  res: Response,
  file: MadeFile,
  type: string,
  kind: 'attachment' | 'inline' = 'attachment',
): void {
  res.setHeader('Content-Type', type);
  res.setHeader('Content-Disposition', contentDisposition(kind, file.name));
  res.setHeader('Cache-Control', 'private, no-cache');
  res.send(Buffer.from(file.bytes.buffer, file.bytes.byteOffset, file.bytes.byteLength));
}

/** Aborts when the asker has gone away, so that nobody's files are not made. */
export function whileAsked(req: Request, res: Response): AbortSignal {
  const gone = new AbortController();
  res.once('close', () => {
    if (!res.writableFinished) gone.abort(new Error(`${req.originalUrl}: the asker went away`));
  });
  return gone.signal;
}
