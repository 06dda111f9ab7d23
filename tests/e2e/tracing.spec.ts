import AxeBuilder from '@axe-core/playwright';
import DxfParser from 'dxf-parser';
import { drawing, rectangleLines } from '../builders/drawings.ts';
import { checkSums, theOne, unpack } from './layer-set-files.ts';
import { downloadBy, entry, newJob, release, saved, signUp } from './steps.ts';
import { expect, test } from './watched-test.ts';

/** An arch over an opening 356 wide, 50 high: R = (c² / 4 + h²) / 2h, circle geometry. */
const ARCH = { width: 356, rise: 50 };
const RADIUS = (ARCH.width ** 2 / 4 + ARCH.rise ** 2) / (2 * ARCH.rise);
const HALF_DEGREES = (Math.asin(ARCH.width / 2 / RADIUS) * 180) / Math.PI;

const line = (x0: number, y0: number, x1: number, y1: number) => [0, 'LINE', 8, '0', 10, x0, 20, y0, 11, x1, 21, y1];

/** Two frames in millimetres without a word of the unit: a corner 0.03 open, a line drawn twice, an arch as an arc. */
const TWO_FRAMES = drawing(
  [
    ...rectangleLines(0, 0, 838, 775),
    ...rectangleLines(44, 32, 400, 730),
    ...rectangleLines(438, 32, 794, 730),
    ...line(838, 0, 0, 0),
    ...rectangleLines(950, 0, 1394, 775),
    ...line(994, 32, 1350, 32),
    ...line(1350, 32.03, 1350, 680),
    ...[0, 'ARC', 8, '0', 10, 1172, 20, 680 + ARCH.rise - RADIUS, 40, RADIUS, 50, 90 - HALF_DEGREES],
    ...[51, 90 + HALF_DEGREES],
    ...line(994, 680, 994, 32),
  ],
  null,
);

test('When somebody’s drawing is uploaded, then frames are traced from it, released and cut as they were drawn', async ({
  page,
}) => {
  await signUp(page);
  await newJob(page, 'Traced kitchen');
  await page.getByRole('link', { name: 'Add from a drawing' }).click();
  await page
    .getByLabel('Drawing', { exact: true })
    .setInputFiles({ name: 'kitchen.dxf', mimeType: 'application/dxf', buffer: Buffer.from(TWO_FRAMES) });

  await expect(page).toHaveURL(/\/drawings\/[^/]+$/);
  await page.getByRole('button', { name: /^Millimetres 1394 × 775 mm/ }).click();
  await expect(page.getByText('1 line drawn twice left out, 1 gap closed.')).toBeVisible();
  await expect(page.getByText('A gap of 0.03 mm was closed here.')).toBeVisible();
  await page.getByRole('button', { name: /^Show \d on the drawing/ }).click();
  await expect(page.getByRole('img', { name: /^Drawing: 2 perimeters, 3 openings/ })).toBeVisible();

  // A role by the list, taken back; another one by a click on the drawing.
  await page.getByRole('combobox', { name: 'Loop 2 is' }).selectOption('leave-out');
  await expect(page.getByText('1 opening, 0 dados')).toHaveCount(2);
  await page.getByRole('button', { name: 'Undo', exact: true }).click();
  await expect(page.getByText('2 openings, 0 dados')).toBeVisible();
  await page.getByRole('button', { name: 'Fit', exact: true }).click();
  const svg = (await page.getByRole('img', { name: /^Drawing:/ }).boundingBox())!;
  // Left of the middle of the drawing lies the second opening of the first frame.
  await page.mouse.click(svg.x + svg.width * 0.45, svg.y + svg.height / 2);
  await expect(page.getByText('Loop 3, 356 × 698 mm: opening.')).toBeVisible();
  await page.getByRole('group', { name: 'Make it' }).getByRole('button', { name: 'Leave out' }).click();
  await expect(page.getByText('Loop 3, 356 × 698 mm: leave out.')).toBeVisible();

  await page.getByLabel('Name of frame 2').fill('Arched');
  await page.getByRole('button', { name: 'Add 2 frames' }).click();
  await expect(page).toHaveURL(/\/jobs\/[^/]+$/);
  await expect(page.getByRole('list', { name: 'Frames of kitchen.dxf' }).getByRole('link')).toHaveText([
    'kitchen 1',
    'Arched',
  ]);

  await page.getByRole('table').getByRole('link', { name: 'Arched', exact: true }).click();
  await expect(page.getByText('Traced outline, 444 × 775')).toBeVisible();
  const file = await downloadBy(page, () => page.getByRole('link', { name: 'kitchen.dxf' }).click());
  expect(file.suggestedFilename()).toBe('kitchen.dxf');
  await saved(page);
  await release(page, 'A');
  const set = await unpack(await downloadBy(page, () => page.getByRole('button', { name: 'Layer set A' }).click()));
  expect(checkSums(set, 'SHA256SUMS').every((said) => said.endsWith(': OK'))).toBe(true);

  // dxf-parser: the opening is as large as it was drawn, with one arc of that rise: bulge = 2h / c (tan of a quarter of its angle).
  const parsed = new DxfParser().parseSync(set.read(theOne(set.names, '_rev-A_front.dxf')))!;
  const [opening, ...others] = parsed.entities.filter(({ layer }) => layer === 'FRONT_OPENING') as unknown as {
    vertices: { x: number; y: number; bulge?: number }[];
  }[];
  expect(others).toEqual([]);
  const xs = opening!.vertices.map(({ x }) => x);
  expect(Math.max(...xs) - Math.min(...xs)).toBeCloseTo(ARCH.width, 4);
  const bulges = opening!.vertices.flatMap(({ bulge }) => (bulge ? [Math.abs(bulge)] : []));
  expect(bulges).toHaveLength(1);
  expect(bulges[0]).toBeCloseTo((2 * ARCH.rise) / ARCH.width, 5);
});

test('When a drawing is gone through by keyboard alone, then loops get roles and frames are added, and axe finds nothing', async ({
  page,
}) => {
  await signUp(page);
  await newJob(page, 'By keyboard');
  await page.getByRole('link', { name: 'Add from a drawing' }).press('Enter');
  await page.getByRole('button', { name: 'Try a sample' }).press('Enter');
  await expect(page.getByText('A gap of 0.0254 mm was closed here.')).toBeVisible();
  const plan = page.getByRole('group', { name: /^Drawing/ });
  await plan.focus();
  for (const key of ['n', 'n', '+', 'ArrowLeft', 'd']) await page.keyboard.press(key);
  await expect(page.getByText(/^Loop 2, .*: dado\.$/)).toBeVisible();
  await page.keyboard.press('Control+z');
  await expect(page.getByText(/^Loop 2, .*: opening\.$/)).toBeVisible();
  const { violations } = await new AxeBuilder({ page }).analyze();
  expect(violations.map(({ id, nodes }) => `${id}: ${nodes[0]?.html}`)).toEqual([]);
  await page.getByRole('checkbox', { name: 'Frame 1 as stiles and rails' }).press('Space');
  await page.getByRole('button', { name: 'Add 2 frames' }).press('Enter');
  await expect(page.getByRole('list', { name: 'Frames of two-frames-to-try.dxf' })).toBeVisible();
  await page.getByRole('table').getByRole('link', { name: 'two-frames-to-try 1' }).press('Enter');
  await expect(entry(page, 'outline.stiles.left')).toHaveValue('1 3/4');
});

test('When the file is no drawing, then it says what to export instead', async ({ page, complaints }) => {
  complaints.allow(/422/);
  await signUp(page);
  await newJob(page, 'Wrong file');
  await page.getByRole('link', { name: 'Add from a drawing' }).click();
  await page
    .getByLabel('Drawing', { exact: true })
    .setInputFiles({ name: 'kitchen.dxf', mimeType: 'application/dxf', buffer: Buffer.from('%PDF-1.7\n') });
  await expect(page.getByRole('alert')).toContainText('Export the drawing as an ASCII DXF');
});
