import DxfParser from 'dxf-parser';
import { readWithEzdxf } from '../readers/read-with-ezdxf.ts';
import { checkSums, theOne, unpack } from './layer-set-files.ts';
import { downloadBy, entry, newFrame, newJob, release, saved, signUp, type } from './steps.ts';
import { expect, test } from './watched-test.ts';

/** Vertices of the one closed contour of a layer that holds a place among its corners. */
type Corner = { x: number; y: number };

test('When a designer signs up, enters a frame and releases it, then the zip holds what was entered', async ({
  page,
}) => {
  await signUp(page);
  await newJob(page, 'Fenwick Lane kitchen');
  await newFrame(page, 'B33 two-door base');

  await type(page, 'outline.width', '33');
  await type(page, 'outline.height', '30 1/2"');
  await type(page, 'outline.stiles.left', '1.75');
  await type(page, 'outline.stiles.right', '1-3/4');
  await type(page, 'outline.rails.top', '44.45mm');
  await type(page, 'outline.rails.bottom', '1 1/4');

  // Both faces show the board at once: frame and allowance and trim all round.
  await expect(page.getByRole('img', { name: 'Back face' })).toBeVisible();
  await expect(page.getByRole('img', { name: 'Front face' })).toBeVisible();
  await expect(page.getByText(/35 1\/2 × 33/).first()).toBeVisible();
  await saved(page);

  await release(page, 'A');
  const set = await unpack(await downloadBy(page, () => page.getByRole('button', { name: 'Layer set A' }).click()));

  const front = theOne(set.names, '_rev-A_front.dxf');
  const back = theOne(set.names, '_rev-A_back.dxf');
  expect(set.names).toEqual(
    [theOne(set.names, '_rev-A.frame.json'), back, front, 'SHA256SUMS', 'layers.csv', 'setup-sheet.pdf'].sort(),
  );
  expect(checkSums(set, 'SHA256SUMS')).toHaveLength(set.names.length - 1);
  expect(checkSums(set, 'SHA256SUMS').every((line) => line.endsWith(': OK'))).toBe(true);

  // dxf-parser: the first opening is where the members leave it, moved by the allowance.
  const parsed = new DxfParser().parseSync(set.read(front));
  const entered = parsed!.entities.filter((entity) => entity.layer === 'FRONT_OPENING') as unknown as {
    vertices: Corner[];
    shape: boolean;
  }[];
  expect(entered).toHaveLength(2);
  expect(entered.every((polyline) => polyline.shape)).toBe(true);
  const allowance = 1;
  const xs = entered.flatMap((polyline) => polyline.vertices.map((v) => v.x));
  const ys = entered.flatMap((polyline) => polyline.vertices.map((v) => v.y));
  expect(Math.min(...xs)).toBeCloseTo(1.75 + allowance, 6);
  expect(Math.max(...xs)).toBeCloseTo(33 - 1.75 + allowance, 6);
  expect(Math.min(...ys)).toBeCloseTo(1.25 + allowance, 6);
  expect(Math.max(...ys)).toBeCloseTo(30.5 - 1.75 + allowance, 6);

  // ezdxf: nothing to complain of, nothing to mend, in both files.
  for (const name of [back, front]) {
    const file = readWithEzdxf([set.path(name)])[0]!;
    expect(file.errors).toEqual([]);
    expect(file.fixes).toEqual([]);
    expect(file.version).toBe('AC1021');
    expect(file.entities.length).toBeGreaterThan(2);
  }

  // The frame file in the zip is what was typed, exactly.
  const particulars = JSON.parse(set.read(theOne(set.names, '.frame.json'))) as { outline: Record<string, unknown> };
  expect(particulars.outline).toMatchObject({
    width: 33,
    height: 30.5,
    stiles: { left: 1.75, right: 1.75 },
    rails: { top: 1.75, bottom: 1.25 },
  });
});

test('When a revision is released, then the draft goes on and the revision stays', async ({ page }) => {
  await signUp(page);
  await newJob(page, 'Two revisions');
  await newFrame(page, 'Base');
  await release(page, 'A');
  await page.keyboard.press('Escape');
  await expect(page.getByRole('button', { name: 'Download revision A' })).toBeVisible();

  await type(page, 'outline.width', '40');
  await saved(page);
  await release(page, 'B');
  const revisions = page.getByRole('list', { name: 'Revisions' });
  await expect(revisions.getByRole('listitem')).toHaveCount(2);

  const setOf = async (letter: string) =>
    unpack(await downloadBy(page, () => page.getByRole('button', { name: `Layer set ${letter}` }).click()));
  const widthIn = async (letter: string) => {
    const set = await setOf(letter);
    return (JSON.parse(set.read(theOne(set.names, '.frame.json'))) as { outline: { width: number } }).outline.width;
  };
  expect(await widthIn('B')).toBe(40);
  expect(await widthIn('A')).not.toBe(40);
  await page.keyboard.press('Escape');
  await expect(entry(page, 'outline.width')).toHaveValue('40');
});
