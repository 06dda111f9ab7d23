import type { Readable } from 'node:stream';

/** A file as it is kept. */
export interface KeptFile {
  /** SHA-256 of its bytes, hexadecimal: its name in the store. */
  readonly sha256: string;
  readonly bytes: number;
}

/** People's own files, by the hash of what is in them: the same file is kept once, and what is read is what was written. */
export interface FileStore {
  /** Keeps what a stream brings; null when it is longer than `longest` bytes, and nothing is kept then. Rejects when the stream does. */
  keep(stream: Readable, longest: number): Promise<KeptFile | null>;
  /** Throws when there is no such file, or it is no longer what was kept. */
  read(sha256: string): Promise<Uint8Array>;
}
