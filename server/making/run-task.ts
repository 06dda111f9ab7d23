import { describeSheet } from '#shared/kernel/sheet/describe-sheet.ts';
import { workFrame } from '#shared/kernel/work-frame.ts';
import { buildJobSet } from '../layer-set/build-job-set.ts';
import { buildLayerSet } from '../layer-set/build-layer-set.ts';
import { safeName } from '../layer-set/safe-name.ts';
import { writeSetupSheet } from '../pdf/write-setup-sheet.ts';
import { proveFrame } from './prove-frame.ts';
import { summarizeFrame } from './summarize-frame.ts';
import type { TaskKind, Tasks } from './tasks.ts';

const RUN: { [K in TaskKind]: (input: Tasks[K]['input']) => Promise<Tasks[K]['result']> } = {
  'layer-set': async (input) => {
    const set = await buildLayerSet(input);
    return { name: set.zipName, bytes: set.zip };
  },

  'job-set': async (input) => {
    const set = await buildJobSet(input);
    return { name: set.zipName, bytes: set.zip };
  },

  'setup-sheet': async (input) => {
    const set = await buildLayerSet(input);
    const sheet = set.files.find((file) => file.name === 'setup-sheet.pdf');
    if (!sheet) throw new Error('the layer set has no setup-sheet.pdf');
    return { name: set.zipName.replace(/\.zip$/, '_setup-sheet.pdf'), bytes: sheet.bytes };
  },

  'draft-sheet': async ({ particulars, paper, changedAt, ...context }) => {
    const model = describeSheet(workFrame(particulars), { ...context, revision: '', releasedAt: changedAt, note: '', proof: null });
    return { name: `${safeName(particulars.name, 'frame')}_draft_setup-sheet.pdf`, bytes: await writeSetupSheet(model, paper) };
  },

  proof: async ({ particulars, profiles }) => proveFrame(particulars, profiles),

  summary: async (particulars) => summarizeFrame(particulars),
};

/** Does one task in a worker thread. Throws what the makers of files throw. */
export const runTask = <K extends TaskKind>(kind: K, input: Tasks[K]['input']): Promise<Tasks[K]['result']> => RUN[kind](input);
