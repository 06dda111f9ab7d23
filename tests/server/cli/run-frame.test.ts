import { spawnSync } from 'node:child_process';
import { existsSync, mkdtempSync, readdirSync, readFileSync, rmSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { afterEach, beforeEach, describe, expect, test } from 'vitest';
import { writeFrameFile } from '#shared/contracts/write-frame-file.ts';
import { BUILTIN_PROFILES } from '#shared/kernel/profiles/builtin-profiles.ts';
import type { Particulars } from '#shared/kernel/particulars/particulars.ts';
import { runFrame } from '../../../server/cli/run-frame.ts';
import { dado, workedExample } from '../../builders/worked-example.ts';
import { runReader } from '../../readers/run-reader.ts';

let folder: string;
beforeEach(() => (folder = mkdtempSync(join(tmpdir(), 'stilepost-cli-'))));
afterEach(() => rmSync(folder, { recursive: true, force: true }));

function save(name: string, content: string): string {
  writeFileSync(join(folder, name), content);
  return join(folder, name);
}
const saveFrame = (particulars: Particulars = workedExample()) => save('a.frame.json', writeFrameFile(particulars));
const outFolder = () => join(folder, 'out');

async function run(...args: string[]): Promise<{ code: number; out: string; err: string }> {
  let out = '';
  let err = '';
  const code = await runFrame(args, '2031-05-06', { out: (t) => (out += t), err: (t) => (err += t) });
  return { code, out, err };
}

/** Exit code 2, nothing on standard output, nothing written; returns what was said. */
async function refused(...args: string[]): Promise<string> {
  const { code, out, err } = await run(...args, '--out', outFolder());
  expect({ code, out, written: existsSync(outFolder()) }).toEqual({ code: 2, out: '', written: false });
  return err;
}

describe('When the frame is good', () => {
  test('then its files lie in the folder, their paths on standard output, and the exit code is 0', async () => {
    const { code, out, err } = await run(saveFrame(), '--out', outFolder());
    expect(code).toBe(0);
    const names = [
      'Two-door-base_draft_back.dxf',
      'Two-door-base_draft_front.dxf',
      'setup-sheet.pdf',
      'Two-door-base_draft.frame.json',
      'layers.csv',
      'SHA256SUMS',
    ];
    expect(out).toBe(names.map((n) => `${join(outFolder(), n)}\n`).join(''));
    expect(readdirSync(outFolder()).sort()).toEqual([...names].sort());
    runReader('sh', ['-c', 'cd "$1" && sha256sum -c SHA256SUMS', 'sh', outFolder()]);
    // What is no stop is said all the same.
    expect(err).toMatch(/^caution: /m);
    expect(err).not.toMatch(/^stop: /m);
  });

  test('then --zip writes one zip, named after job, frame and revision', async () => {
    const { code, out } = await run(
      saveFrame(),
      '--out',
      outFolder(),
      '--zip',
      '--revision',
      'B',
      '--job',
      'Fenwick Lane kitchen',
    );
    expect(code).toBe(0);
    expect(readdirSync(outFolder())).toEqual(['Fenwick-Lane-kitchen_Two-door-base_rev-B.zip']);
    expect(out.trim()).toBe(join(outFolder(), 'Fenwick-Lane-kitchen_Two-door-base_rev-B.zip'));
  });

  test.each([
    ['r12', 'AC1009'],
    ['R12 for older programs', 'AC1009'],
    ['axis-only', 'AC1021'],
  ])('then --profile takes the built-in %j', async (name, version) => {
    expect((await run(saveFrame(), '--out', outFolder(), '--profile', name)).code).toBe(0);
    expect(readFileSync(join(outFolder(), 'Two-door-base_draft_back.dxf'), 'utf8')).toContain(`\n${version}\n`);
  });

  test('then --profile takes a profile file', async () => {
    const profile = {
      ...BUILTIN_PROFILES[1]!.profile,
      name: 'Partner shop',
      unit: 'mm',
      layerTemplate: 'ta-{face}-{set}',
    };
    expect(
      (await run(saveFrame(), '--out', outFolder(), '--profile', save('p.json', JSON.stringify(profile)))).code,
    ).toBe(0);
    expect(readFileSync(join(outFolder(), 'layers.csv'), 'utf8')).toContain('\r\nback,TA-BACK-DADO,1,');
  });
});

describe('When a stop or the proof forbids the set, then the exit code is 1, the findings are on standard error, nothing is written', () => {
  test('a stop', async () => {
    const { code, out, err } = await run(
      saveFrame(workedExample({ dados: [dado({ panel: 0.25 })] })),
      '--out',
      outFolder(),
    );
    expect({ code, out, written: existsSync(outFolder()) }).toEqual({ code: 1, out: '', written: false });
    expect(err).toMatch(/^stop: Dado Left end is 0\.26 in wide; its cutter is 3\/8 in/m);
    expect(err).toContain('(dados.0.panel)');
  });

  test('a template that is good as such and clashes on this frame', async () => {
    // Names are cut off at 31 characters, and this cutter's name alone has more.
    const { cutters } = workedExample();
    const name = 'a tapered cutter with a remarkably long name';
    const particulars = workedExample({ cutters: { ...cutters, opening: { ...cutters.opening, name } } });
    const profile = save(
      'long.json',
      JSON.stringify({ ...BUILTIN_PROFILES[0]!.profile, layerTemplate: '{face}_{cutter}_{set}' }),
    );
    const { code, out, err } = await run(saveFrame(particulars), '--out', outFolder(), '--profile', profile);
    expect({ code, out, written: existsSync(outFolder()) }).toEqual({ code: 1, out: '', written: false });
    expect(err).toMatch(/^proof: .*would both be on layer FRONT_A.TAPERED.CUTTER/m);
  });
});

describe('When an input cannot be read or is not valid, then the exit code is 2 and the message says what it got and takes', () => {
  test('a file that is not there', async () => {
    expect(await refused(join(folder, 'none.json'))).toMatch(/none\.json: cannot be read \(ENOENT/);
  });

  test('a folder', async () => {
    expect(await refused(folder)).toMatch(/cannot be read \(EISDIR/);
  });

  test('no JSON', async () => {
    expect(await refused(save('a.json', 'width: 3'))).toMatch(/not a frame file: it is not JSON/);
  });

  test('wrong and unknown fields, each by its name', async () => {
    const broken = { ...workedExample(), thickness: -1, colour: 'red' };
    const err = await refused(save('a.json', JSON.stringify(broken)));
    expect(err).toContain('thickness: got -1, takes a length above 0');
    expect(err).toContain('colour: got a key that is not known');
  });

  test('a profile that is not there', async () => {
    expect(await refused(saveFrame(), '--profile', 'r2013')).toMatch(
      /--profile: got "r2013", takes r2007, r12, axis-only or the path of a profile file/,
    );
  });

  test('a profile file with a wrong field, a wrong template, no JSON', async () => {
    const { profile } = BUILTIN_PROFILES[0]!;
    expect(
      await refused(saveFrame(), '--profile', save('p.json', JSON.stringify({ ...profile, decimals: 9 }))),
    ).toMatch(/decimals: got 9/);
    expect(
      await refused(saveFrame(), '--profile', save('p.json', JSON.stringify({ ...profile, layerTemplate: '{face}' }))),
    ).toMatch(/layerTemplate: got "\{face\}", takes/);
    expect(await refused(saveFrame(), '--profile', save('p.json', '{'))).toMatch(/not a file profile: it is not JSON/);
  });

  test('an unknown option, no file, two files, odd values: with the usage', async () => {
    for (const args of [
      ['--colour', 'red'],
      [],
      ['a', 'b'],
      ['a', '--paper', 'A3'],
      ['a', '--date', '2031-02-30'],
      ['a', '--revision', 'a/b'],
    ]) {
      expect(await refused(...args)).toMatch(/npm run frame -- FILE\.frame\.json/);
    }
  });

  test('a folder that cannot be made', async () => {
    const { code, out, err } = await run(saveFrame(), '--out', join(saveFrame(), 'under-a-file'));
    expect({ code, out }).toEqual({ code: 2, out: '' });
    expect(err).toMatch(/--out: got .* takes a folder that can be written to/);
  });
});

test('When help is asked for, then it names every option and the exit codes', async () => {
  const { code, out } = await run('--help');
  expect(code).toBe(0);
  for (const word of ['--out', '--profile', '--zip', '--revision', '--job', '--date', 'Exit code'])
    expect(out).toContain(word);
});

// A process of its own for each, which compiles all it needs: slow on a busy machine.
describe('When it is run as a command', { timeout: 120_000 }, () => {
  const command = (args: string[], input?: string) =>
    spawnSync(
      process.execPath,
      ['--import', import.meta.resolve('tsx'), join(import.meta.dirname, '../../../server/cli/frame.ts'), ...args],
      { input, encoding: 'utf8', cwd: folder },
    );

  test('then - reads standard input, and without --out the files lie where it was run', () => {
    const { status, stdout } = command(['-', '--zip', '--date', '2031-05-06'], writeFrameFile(workedExample()));
    expect({ status, stdout }).toEqual({ status: 0, stdout: 'Single-frame_Two-door-base_draft.zip\n' });
    expect(readdirSync(folder)).toEqual(['Single-frame_Two-door-base_draft.zip']);
  });

  test('then the exit code tells a bad file', () => {
    const { status, stdout, stderr } = command(['-'], '{}');
    expect({ status, stdout }).toEqual({ status: 2, stdout: '' });
    expect(stderr).toMatch(/^standard input: not a valid frame file/);
  });
});
