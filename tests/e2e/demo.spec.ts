import { readWithEzdxf } from '../readers/read-with-ezdxf.ts';
import { readWithOgrinfo } from '../readers/read-with-ogrinfo.ts';
import { plotWithLibrecad } from '../readers/plot-with-librecad.ts';
import { checkSums, unpack } from './layer-set-files.ts';
import { downloadBy, openDemo } from './steps.ts';
import { expect, test } from './watched-test.ts';

/** At least so many frames has the demo job, each different. */
const FRAMES = 6;

for (const [profile, version] of [
  ['r2007', 'AC1021'],
  ['r12', 'AC1009'],
] as const) {
  test(`When the demo job is downloaded as ${profile}, then every frame is a proved set that other programs read`, async ({
    page,
  }) => {
    test.setTimeout(240_000);
    await openDemo(page);
    await page.getByRole('link', { name: 'Fenwick Lane kitchen' }).first().click();
    await page.getByLabel('File profile').selectOption(profile);
    const download = await downloadBy(page, () =>
      page.getByRole('button', { name: 'Download all layer sets' }).click(),
    );
    const set = await unpack(download);

    const sums = set.names.filter((name) => name.endsWith('SHA256SUMS'));
    expect(sums.length).toBeGreaterThanOrEqual(FRAMES);
    for (const name of sums) expect(checkSums(set, name).every((line) => line.endsWith(': OK'))).toBe(true);

    const dxfs = set.names.filter((name) => name.endsWith('.dxf'));
    expect(dxfs).toHaveLength(2 * (sums.length - (sums.includes('SHA256SUMS') ? 1 : 0)));
    const paths = dxfs.map(set.path);
    for (const [i, file] of readWithEzdxf(paths).entries()) {
      expect({ name: dxfs[i], errors: file.errors, fixes: file.fixes, version: file.version }).toEqual({
        name: dxfs[i],
        errors: [],
        fixes: [],
        version,
      });
      const seen = readWithOgrinfo(paths[i]!);
      expect(seen.length, `ogrinfo sees as many in ${dxfs[i]}`).toBe(file.entities.length);
    }
    const dots = plotWithLibrecad(paths, set.folder);
    expect(Math.min(...dots)).toBeGreaterThan(100);
  });
}

test('When somebody looks at the demo as an operator, then frames can be read and not changed', async ({ page }) => {
  await page.goto('/sign-in');
  await page.getByLabel('as', { exact: true }).selectOption('operator');
  await page.getByRole('button', { name: 'Open the demo shop' }).click();
  await expect(page).toHaveURL(/\/jobs$/);
  await expect(page.getByRole('button', { name: 'New job' })).toHaveCount(0);
  await page.getByRole('link', { name: 'Fenwick Lane kitchen' }).first().click();
  await page.locator('table a[href^="/frames/"]').first().click();
  await expect(
    page.locator('input[data-entry="outline.width"], input[data-entry="thickness"]').first(),
  ).toHaveAttribute('readonly', '');
  await expect(page.getByRole('button', { name: /^Release/ })).toHaveCount(0);
});
