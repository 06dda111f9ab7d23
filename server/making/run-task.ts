import { traceDrawing } from '#shared/kernel/tracing/trace-drawing.ts';
import { traceFrames } from '#shared/kernel/tracing/trace-frames.ts';
import { safeName } from '../layer-set/safe-name.ts';
import { summarizeFrame } from './summarize-frame.ts';
import type { TaskKind, Tasks } from './tasks.ts';

// What writes PDF is loaded by the first task that needs it: a release, which proves DXF files, must not wait for it.
const layerSets = () => import('../layer-set/build-layer-set.ts');

const RUN: { [K in TaskKind]: (input: Tasks[K]['input']) => Promise<Tasks[K]['result']> } = {
  'layer-set': async (input) => {
    const { buildLayerSet } = await layerSets();
    const set = await buildLayerSet(input);
    return { name: set.zipName, bytes: set.zip };
  },

  'job-set': async (input) => {
    const { buildJobSet } = await import('../layer-set/build-job-set.ts');
    const set = await buildJobSet(input);
    return { name: set.zipName, bytes: set.zip };
  },

  'setup-sheet': async (input) => {
    const { buildLayerSet } = await layerSets();
    const set = await buildLayerSet(input);
    const sheet = set.files.find((file) => file.name === 'setup-sheet.pdf');
    if (!sheet) throw new Error('the layer set has no setup-sheet.pdf');
    return { name: set.zipName.replace(/\.zip$/, '_setup-sheet.pdf'), bytes: sheet.bytes };
  },

  'draft-sheet': async (input) => {
    const { writeDraftSheet } = await import('./write-draft-sheet.ts');
    return {
      name: `${safeName(input.particulars.name, 'frame')}_draft_setup-sheet.pdf`,
      bytes: await writeDraftSheet(input),
    };
  },

  proof: async ({ particulars, profiles }) => {
    const { proveFrame } = await import('./prove-frame.ts');
    return proveFrame(particulars, profiles);
  },

  'read-drawing': async ({ bytes, options }) => JSON.stringify(traceDrawing(bytes, options)),

  'trace-frames': async (input) => traceFrames(input),

  summary: async (particulars) => summarizeFrame(particulars),
};

/** Does one task in a worker thread. Throws what the makers of files throw. */
export const runTask = <K extends TaskKind>(kind: K, input: Tasks[K]['input']): Promise<Tasks[K]['result']> =>
  RUN[kind](input);
