import type { Page } from '@playwright/test';
import { readWithEzdxf } from '../readers/read-with-ezdxf.ts';
import { readWithOgrinfo } from '../readers/read-with-ogrinfo.ts';
import { checkSums, theOne, unpack } from './layer-set-files.ts';
import { downloadBy, entry, newJob, release, saved, signUp } from './steps.ts';
import { expect, test } from './watched-test.ts';

/** Of the frame file, what this story holds the screen and the drawings against; millimetres and degrees. */
interface BeadedFile {
  readonly unit: string;
  readonly thickness: number;
  readonly edge: { readonly corners: string; readonly bead: { radius: number; drop: number; quirk: number } };
  readonly dados: readonly { part: string; at: number; panel: number; clearance: number }[];
  readonly setup: { readonly flip: string; readonly allowance: number; readonly trim: number };
  readonly cutters: { readonly opening: { kind: string; tipRadius: number; sideAngle: number } };
}

const see = (page: Page, view: string) => page.getByRole('button', { name: view, exact: true }).click();

/** The number that follows or leads some words on screen, whether it is rounded or not. */
function numberIn(text: string, pattern: RegExp): number {
  const found = pattern.exec(text)?.[1];
  if (found === undefined) throw new Error(`${pattern.source} is not in: ${text}`);
  return Number(found.replace('≈', ''));
}

async function makeArchedFrame(page: Page): Promise<void> {
  await page.getByRole('button', { name: 'New frame' }).first().click();
  const dialog = page.getByRole('dialog');
  await dialog.getByLabel('Name').fill('Arched pair');
  await dialog.getByLabel('Begin from').selectOption({ label: 'Arched bookcase' });
  await dialog.getByText('Millimetres').click();
  await dialog.getByRole('button', { name: 'Create the frame' }).click();
  await expect(entry(page, 'outline.width')).toBeVisible();
}

/** What the three views say in words. */
async function readViews(page: Page) {
  await see(page, 'Section');
  const drawn = page.getByRole('img', { name: /^Section across a beaded edge/ });
  await expect(drawn).toBeVisible();
  const section = (await drawn.locator('text').allTextContents()).join(' | ');
  await see(page, 'Corners');
  const corner = async (method: string) =>
    (await page.getByRole('img', { name: `inside corner, ${method}` }).getAttribute('aria-label'))!;
  const corners = {
    lift: await corner('climbing into the corner'),
    vee: await corner('V-cutter after it'),
    round: await corner('left round'),
  };
  await see(page, 'Cut part');
  await page.getByLabel('Look at').selectOption({ label: 'Opening A, lower left corner' });
  await page.getByRole('button', { name: 'Corner V' }).click();
  const sentence = page.getByText(/^After step \d+ of \d+, front, corner V: .* Worked out every/);
  await expect(sentence).toBeVisible({ timeout: 30_000 });
  const left = page.getByText(/of board left standing at opening/);
  await expect(left).toBeVisible({ timeout: 30_000 });
  await expect(page.getByRole('application', { name: 'Cut part' })).toHaveAccessibleDescription(
    /^Opening A, lower left corner\. Seen from the front\./,
  );
  return { section, corners, cutPart: await sentence.innerText(), left: await left.innerText() };
}

test('When an arched frame in millimetres is beaded, turned end over end and its corners cut by a V, then its views agree and other programs read its files', async ({
  page,
}) => {
  await signUp(page);
  await newJob(page, 'Linden House');
  await makeArchedFrame(page);
  await page.getByText('Beaded', { exact: true }).click();
  await page.getByText('End over end', { exact: true }).click();
  await page.getByText('V after', { exact: true }).click();
  await saved(page);
  const views = await readViews(page);

  await release(page, 'A');
  const set = await unpack(await downloadBy(page, () => page.getByRole('button', { name: 'Layer set A' }).click()));
  expect(checkSums(set, 'SHA256SUMS').every((line) => line.endsWith(': OK'))).toBe(true);
  const file = JSON.parse(set.read(theOne(set.names, '.frame.json'))) as BeadedFile;
  expect(file).toMatchObject({ unit: 'mm', edge: { corners: 'vee' }, setup: { flip: 'end-over-end' } });

  await test.step('the views say the bead that was entered', () => {
    const { radius, drop, quirk } = file.edge.bead;
    expect(numberIn(views.section, /(\S+)\s+bead ends/)).toBe(2 * radius);
    expect(numberIn(views.section, /(\S+)\s+quirk ends/)).toBe(2 * radius + quirk);
    expect(numberIn(views.section, /(\S+)\s+bead top/)).toBe(drop);
    expect(numberIn(views.section, /(\S+)\s+bead base/)).toBe(drop + radius);
    // A tapered cutter leaves ρ(√2 − 1) in a square corner: ρ its radius at that depth, or by climbing that of its nose's end.
    const { tipRadius: r, sideAngle } = file.cutters.opening;
    const a = (sideAngle * Math.PI) / 180;
    const rho = r / Math.cos(a) + (file.thickness - drop - radius) * Math.tan(a);
    const atBase = /at the bead’s base: (\S+) left/;
    expect(numberIn(views.corners.round, atBase)).toBeCloseTo(rho * (Math.SQRT2 - 1), 3);
    expect(numberIn(views.corners.lift, atBase)).toBeCloseTo(r * Math.cos(a) * (Math.SQRT2 - 1), 3);
    expect(views.corners.vee).toContain('at the bead’s base: nothing left');
    // Sideways from a wall it is 1/√2 of what it is on the diagonal; the cut part tells it in two digits, from samples.
    const below = numberIn(views.corners.vee, /at the back: (\S+) left/);
    expect(Math.abs(numberIn(views.left, /^(\S+) mm of board left/) - below / Math.SQRT2)).toBeLessThan(0.02);
    expect(numberIn(views.cutPart, /Its surfaces here: (\S+) square millimetres/)).toBeGreaterThan(0);
  });

  await test.step('ezdxf finds nothing wrong, and ogrinfo sees as many', () => {
    const names = [theOne(set.names, '_back.dxf'), theOne(set.names, '_front.dxf')] as const;
    const [back, front] = readWithEzdxf(names.map(set.path)) as [
      ReturnType<typeof readWithEzdxf>[number],
      ReturnType<typeof readWithEzdxf>[number],
    ];
    for (const [i, read] of [back, front].entries()) {
      // DXF Reference: $INSUNITS 4 is millimetres.
      expect(read).toMatchObject({ errors: [], fixes: [], version: 'AC1021', units: 4 });
      expect(readWithOgrinfo(set.path(names[i]!))).toHaveLength(read.entities.length);
    }
    const on = (layer: string) => front.entities.filter((entity) => entity.layer === layer);
    for (const layer of ['FRONT_BEAD_INNER', 'FRONT_BEAD_OUTER', 'FRONT_QUIRK', 'FRONT_OPENING']) {
      expect(on(layer).map(({ closed }) => closed)).toEqual([true, true]);
      // The heads stay arcs.
      expect(on(layer).every(({ points }) => points.some(([, , bulge]) => bulge !== 0))).toBe(true);
    }
    // Four corners in each of two openings; each line climbs to the bead's base.
    const { radius, drop } = file.edge.bead;
    for (const layer of ['FRONT_CORNER_LIFT', 'FRONT_CORNER_VEE'])
      expect(on(layer).every(({ is3d }) => is3d)).toBe(true);
    const vees = on('FRONT_CORNER_VEE');
    expect(vees).toHaveLength(8);
    for (const { points } of vees) expect(Math.max(...points.map(([, , z]) => z))).toBeCloseTo(-(drop + radius), 5);
    // Turned end over end the left end stays at the left: trim and allowance from the rough edge.
    const end = file.dados.find(({ part }) => part === 'Left end')!;
    const xs = back.entities
      .filter(({ layer }) => layer === 'BACK_DADO')
      .flatMap(({ points }) => points.map(([x]) => x));
    expect(Math.min(...xs)).toBeCloseTo(file.setup.trim + file.setup.allowance + end.at - end.clearance / 2, 6);
  });
});
