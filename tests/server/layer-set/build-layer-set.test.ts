import { mkdtempSync, rmSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import JSZip from 'jszip';
import { beforeAll, describe, expect, test } from 'vitest';
import { parseFrameFile } from '#shared/contracts/parse-frame-file.ts';
import { buildLayerSet } from '../../../server/layer-set/build-layer-set.ts';
import { ProofFailed, type LayerSet } from '../../../server/layer-set/layer-set.ts';
import { dado, workedExample } from '../../builders/worked-example.ts';
import { runReader } from '../../readers/run-reader.ts';
import { PYTHON } from '../../setup/readers.ts';
import { layerSetInput } from './layer-set-input.ts';

const text = (set: LayerSet, name: string) => new TextDecoder().decode(set.files.find((f) => f.name === name)!.bytes);

describe('When a revision’s layer set is built', () => {
  let set: LayerSet;
  beforeAll(async () => {
    set = await buildLayerSet(layerSetInput());
  });

  test('then the zip is named after job, frame and revision, and holds the files by name', async () => {
    expect(set.zipName).toBe('Fenwick-Lane-kitchen_Two-door-base_rev-A.zip');
    const wanted = [
      'Two-door-base_rev-A_back.dxf',
      'Two-door-base_rev-A_front.dxf',
      'setup-sheet.pdf',
      'Two-door-base_rev-A.frame.json',
      'layers.csv',
      'SHA256SUMS',
    ];
    expect(set.files.map((f) => f.name)).toEqual(wanted);
    const zip = await JSZip.loadAsync(set.zip);
    expect(Object.keys(zip.files)).toEqual(wanted);
    for (const { name, bytes } of set.files) expect(await zip.file(name)!.async('uint8array')).toEqual(bytes);
  });

  test('then Python unpacks the zip, sha256sum -c passes, and fails once a file is changed', () => {
    const folder = mkdtempSync(join(tmpdir(), 'stilepost-set-'));
    try {
      writeFileSync(join(folder, set.zipName), set.zip);
      runReader(PYTHON, ['-m', 'zipfile', '-e', join(folder, set.zipName), folder]);
      const check = () => runReader('sh', ['-c', 'cd "$1" && sha256sum -c SHA256SUMS', 'sh', folder]);
      expect(check().trim().split('\n')).toEqual(set.files.slice(0, -1).map((f) => `${f.name}: OK`));
      writeFileSync(join(folder, 'layers.csv'), 'changed');
      expect(check).toThrow(/1 computed checksum did NOT match/);
    } finally {
      rmSync(folder, { recursive: true, force: true });
    }
  });

  test('then the same input gives the same bytes, later and whatever the time zone', async () => {
    const zone = process.env['TZ'];
    try {
      process.env['TZ'] = 'Pacific/Kiritimati';
      const again = await buildLayerSet(layerSetInput());
      expect(Buffer.from(again.zip).equals(Buffer.from(set.zip))).toBe(true);
    } finally {
      if (zone === undefined) delete process.env['TZ'];
      else process.env['TZ'] = zone;
    }
  });

  test('then the frame file gives the particulars back', () => {
    const read = parseFrameFile(text(set, 'Two-door-base_rev-A.frame.json'));
    expect(read.ok && read.particulars).toEqual(workedExample());
  });

  test('then the sheet is a PDF and the proof says that all holds', () => {
    expect(text(set, 'setup-sheet.pdf').startsWith('%PDF-')).toBe(true);
    expect(set.proof.ok).toBe(true);
    expect(set.proof.checks.length).toBeGreaterThan(20);
  });

  test('then layers.csv has a row for each layer with its numbers', () => {
    const rows = text(set, 'layers.csv').trimEnd().split('\r\n');
    expect(rows[0]).toBe('face,layer,colour,cutter,side of line,depth,passes,entities,length,unit');
    // 2 × (35.5 + 33); openings 2 × 2 × (14 + 27.5).
    expect(rows).toContain('back,BACK_BLANK,8,,not cut,,,1,137.000000,in');
    expect(rows).toContain(
      'front,FRONT_OPENING,5,"tapered, tip radius 1/16 in, 1.5° a side",inside,0.812500,0.812500,2,166.000000,in',
    );
    expect(rows).toHaveLength(9);
  });
});

describe('When a layer set may not leave the house, then there is none', () => {
  const failed = async (changes: Parameters<typeof layerSetInput>[0]) => {
    const error: unknown = await buildLayerSet(layerSetInput(changes)).catch((e: unknown) => e);
    if (!(error instanceof ProofFailed)) throw new Error('no ProofFailed', { cause: error });
    expect(error.proof.ok).toBe(false);
    return error.proof.checks.filter((c) => !c.ok);
  };

  test('a stop', async () => {
    const [check] = await failed({ particulars: workedExample({ dados: [dado({ panel: 0.25 })] }) });
    expect(check!.name).toBe('frame: stops among the findings');
  });

  test('a template that clashes on this frame', async () => {
    const [check] = await failed({ profile: { ...layerSetInput().profile, layerTemplate: '{face}{cutter}' } });
    expect(check!.got).toMatch(/would both be on layer/);
  });

  test('a date that is none', async () => {
    await expect(buildLayerSet(layerSetInput({ releasedAt: 'soon' }))).rejects.toThrow(/soon/);
  });

  test('a revision that is none', async () => {
    await expect(buildLayerSet(layerSetInput({ revision: '../A' }))).rejects.toThrow(/takes capital letters/);
  });
});

test('When there is no revision yet, then the files say draft', async () => {
  const set = await buildLayerSet(
    layerSetInput({ revision: '', jobName: '…', particulars: workedExample({ name: 'con' }) }),
  );
  expect(set.zipName).toBe('job_frame-con_draft.zip');
  expect(set.files[0]!.name).toBe('frame-con_draft_back.dxf');
});

test('When a profile asks for the other unit, then layers.csv follows the files', async () => {
  const set = await buildLayerSet(
    layerSetInput({ profile: { ...layerSetInput().profile, unit: 'mm', decimals: 4, labels: true } }),
  );
  const rows = text(set, 'layers.csv').split('\r\n');
  expect(rows).toContain('back,BACK_BLANK,8,,not cut,,,1,3479.8000,mm');
  expect(rows).toContain('front,FRONT_LABELS,251,,text,,,2,,mm');
});
