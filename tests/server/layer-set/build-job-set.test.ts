import { mkdtempSync, readdirSync, rmSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { afterAll, beforeAll, describe, expect, test } from 'vitest';
import { buildJobSet, type JobSet, type JobSetInput } from '../../../server/layer-set/build-job-set.ts';
import { ProofFailed } from '../../../server/layer-set/layer-set.ts';
import { dado, workedExample } from '../../builders/worked-example.ts';
import { runReader } from '../../readers/run-reader.ts';
import { PYTHON } from '../../setup/readers.ts';
import { layerSetInput } from './layer-set-input.ts';

const frame = (name: string, revision: string) => layerSetInput({ revision, particulars: workedExample({ name }) });

const job: JobSetInput = {
  jobName: 'Fenwick Lane kitchen',
  shopName: 'Tern & Alder Joinery',
  paper: 'A4',
  sets: [frame('Two-door base', 'B'), frame('two door base', 'A'), frame('SHA256sums', 'A')],
};

describe('When the layer sets of a whole job are built', () => {
  let set: JobSet;
  let folder: string;
  beforeAll(async () => {
    set = await buildJobSet(job);
    folder = mkdtempSync(join(tmpdir(), 'stilepost-job-'));
    writeFileSync(join(folder, set.zipName), set.zip);
    runReader(PYTHON, ['-m', 'zipfile', '-e', join(folder, set.zipName), join(folder, 'all')]);
  });
  afterAll(() => rmSync(folder, { recursive: true, force: true }));

  test('then each frame has a folder, and no two files have one name even when all lie together', () => {
    expect(set.zipName).toBe('Fenwick-Lane-kitchen_layer-sets.zip');
    const folders = ['SHA256SUMS', 'SHA256sums-2', 'Two-door-base', 'cover-sheet.pdf', 'two-door-base-2'];
    expect(readdirSync(join(folder, 'all')).sort()).toEqual(folders.sort());
    const dxfs = set.files.map((f) => f.name.split('/').at(-1)!).filter((name) => name.endsWith('.dxf'));
    expect(dxfs).toContain('Two-door-base_rev-B_back.dxf');
    expect(dxfs).toContain('two-door-base-2_rev-A_back.dxf');
    expect(new Set(dxfs.map((name) => name.toLowerCase())).size).toBe(6);
  });

  test('then sha256sum -c passes for the whole and in each folder', () => {
    const check = (at: string) =>
      runReader('sh', ['-c', 'cd "$1" && sha256sum -c SHA256SUMS', 'sh', join(folder, 'all', at)]);
    expect(check('').trim().split('\n')).toHaveLength(set.files.length - 1);
    expect(check('Two-door-base').trim().split('\n')).toHaveLength(5);
  });

  test('then the cover sheet lists the frames, their revisions and their folders', () => {
    const text = runReader('pdftotext', ['-layout', join(folder, 'all', 'cover-sheet.pdf'), '-']);
    for (const name of ['Two-door base', 'two door base', 'SHA256sums', 'two-door-base-2/', 'Fenwick Lane kitchen']) {
      expect(text).toContain(name);
    }
  });

  test('then the same input gives the same bytes', async () => {
    expect(Buffer.from((await buildJobSet(job)).zip).equals(Buffer.from(set.zip))).toBe(true);
  });
});

describe('When a job set cannot be built', () => {
  test('then one frame with a stop keeps the whole back, and is named', async () => {
    const bad = layerSetInput({ particulars: workedExample({ name: 'Corner', dados: [dado({ panel: 0.25 })] }) });
    const failure = buildJobSet({ ...job, sets: [...job.sets, bad] });
    await expect(failure).rejects.toThrow(ProofFailed);
    await expect(failure).rejects.toThrow(/"Corner"/);
  });

  test('then a job without frames is refused', async () => {
    await expect(buildJobSet({ ...job, sets: [] })).rejects.toThrow(/takes at least one/);
  });
});
