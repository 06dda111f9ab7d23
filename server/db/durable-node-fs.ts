import { closeSync, fsyncSync, openSync } from 'node:fs';
import type { PGlite } from '@electric-sql/pglite';
import { NodeFS } from '@electric-sql/pglite/nodefs';

type InitOptions = Parameters<NodeFS['init']>[1];

/** The parts of the Emscripten runtime that are touched here. */
interface NodeMount {
  stream_ops: { fsync?: (stream: { nfd?: number; node: unknown }) => number };
  realPath(node: unknown): string;
}

function fsyncFolder(path: string): void {
  const handle = openSync(path, 'r');
  try {
    fsyncSync(handle);
  } finally {
    closeSync(handle);
  }
}

/**
 * A data folder whose fsync reaches the disk. The one that comes with PGlite has none,
 * so a power cut would lose what was already confirmed.
 */
export class DurableNodeFs extends NodeFS {
  override async init(pg: PGlite, options: InitOptions): ReturnType<NodeFS['init']> {
    const mounted = await super.init(pg, options);
    const addFsync = (module: unknown): void => {
      const mount = (module as { NODEFS: NodeMount }).NODEFS;
      mount.stream_ops.fsync = (stream) => {
        if (stream.nfd === undefined) fsyncFolder(mount.realPath(stream.node));
        else fsyncSync(stream.nfd);
        return 0;
      };
    };
    const preRun = (mounted.emscriptenOpts.preRun ?? []) as ((module: unknown) => void)[];
    return {
      emscriptenOpts: { ...mounted.emscriptenOpts, preRun: [...preRun, addFsync] } as typeof mounted.emscriptenOpts,
    };
  }
}
