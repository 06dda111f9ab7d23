import { describe, expect, test } from 'vitest';
import fc from 'fast-check';
import { BUILTIN_PROFILES } from '#shared/kernel/profiles/builtin-profiles.ts';
import { checkLayerTemplate } from '#shared/kernel/profiles/check-layer-template.ts';
import type { FileProfile } from '#shared/kernel/profiles/file-profile.ts';
import { LayerClash } from '#shared/kernel/profiles/layer-clash.ts';
import { layerName } from '#shared/kernel/profiles/layer-name.ts';
import { nameLayers } from '#shared/kernel/profiles/name-layers.ts';
import type { Particulars } from '#shared/kernel/particulars/particulars.ts';
import { workFrame } from '#shared/kernel/work-frame.ts';
import { dado, workedExample } from '../../../builders/worked-example.ts';

const [standard, , axisOnly] = BUILTIN_PROFILES.map((p) => p.profile) as [FileProfile, FileProfile, FileProfile];
const names = (particulars: Particulars, profile: Partial<FileProfile> = {}) =>
  Object.fromEntries(
    [...nameLayers(workFrame(particulars), { ...standard, ...profile })].map(([key, layer]) => [key, layer.name]),
  );

test('When a shop has made no profile, then it has the three that come with the product', () => {
  expect(BUILTIN_PROFILES.map(({ id, profile }) => [id, profile.flavour, profile.openingLines])).toEqual([
    ['r2007', 'R2007', 'both'],
    ['r12', 'R12', 'both'],
    ['axis-only', 'R2007', 'axis'],
  ]);
  expect(new Set(BUILTIN_PROFILES.map((p) => p.profile.name.toLowerCase())).size).toBe(3);
});

describe('When layers are named by the default template', () => {
  test('then they have the names that help and sheets use', () => {
    expect(names(workedExample())).toEqual({
      'back/DADO': 'BACK_DADO',
      'back/SQUARING': 'BACK_SQUARING',
      'back/BLANK': 'BACK_BLANK',
      'front/OPENING': 'FRONT_OPENING',
      'front/OPENING_AXIS': 'FRONT_OPENING_AXIS',
      'front/CORNER_LIFT': 'FRONT_CORNER_LIFT',
      'front/PERIMETER': 'FRONT_PERIMETER',
      'front/BLANK': 'FRONT_BLANK',
    });
  });

  test('then dados of several depths say theirs', () => {
    const particulars = workedExample({ dados: [dado(), dado({ at: 20, depth: 0.375 })] });
    expect(names(particulars)).toMatchObject({
      'back/DADO_D0250': 'BACK_DADO_D0250',
      'back/DADO_D0375': 'BACK_DADO_D0375',
    });
  });

  test('then a profile with one of the opening layers has no name for the other', () => {
    expect(names(workedExample(), axisOnly)).not.toHaveProperty('front/OPENING');
    expect(names(workedExample(), { openingLines: 'entered' })).not.toHaveProperty('front/OPENING_AXIS');
  });

  test('then labels have a layer of their own on each face, when wanted', () => {
    expect(names(workedExample(), { labels: true })).toMatchObject({
      'back/LABELS': 'BACK_LABELS',
      'front/LABELS': 'FRONT_LABELS',
    });
    expect(names(workedExample())).not.toHaveProperty('front/LABELS');
  });
});

describe('When a template names the cutter and the depth', () => {
  const { cutters } = workedExample();
  const particulars = workedExample({
    cutters: {
      ...cutters,
      dado: { ...cutters.dado, name: 'Düse 3/8"', number: 4 },
      opening: { ...cutters.opening, number: 12 },
    },
  });
  const layerTemplate = '{face}-{set}-{cutter}-{depth}';

  test('then the cutter is its name, its number or its task, and the depth thousandths of an inch', () => {
    expect(names(particulars, { layerTemplate, openingLines: 'axis' })).toEqual({
      'back/DADO': 'BACK-DADO-DUSE_3_8_-0250',
      'back/SQUARING': 'BACK-SQUARING-SQUARING-0770',
      'back/BLANK': 'BACK-BLANK-NONE-0000',
      'front/OPENING_AXIS': 'FRONT-OPENING_AXIS-T12-0813',
      'front/CORNER_LIFT': 'FRONT-CORNER_LIFT-T12-0813',
      'front/PERIMETER': 'FRONT-PERIMETER-PERIMETER-0770',
      'front/BLANK': 'FRONT-BLANK-NONE-0000',
    });
  });

  test('then a file in millimetres says hundredths of a millimetre', () => {
    expect(names(particulars, { layerTemplate, unit: 'mm' })['back/DADO']).toBe('BACK-DADO-DUSE_3_8_-0635');
  });
});

describe('When a template does not tell the line sets of a frame apart, then the frame is refused and nothing is merged', () => {
  test.each<[string, Particulars, Partial<FileProfile>, RegExp]>([
    [
      'no {set}',
      workedExample(),
      { layerTemplate: '{face}_{cutter}' },
      /front\/OPENING and front\/OPENING_AXIS would both be on layer FRONT_OPENING/,
    ],
    [
      'no {face}, both blanks',
      workedExample(),
      { layerTemplate: '{set}' },
      /back\/BLANK and front\/BLANK would both be on layer BLANK/,
    ],
    [
      'names cut off at 31 characters',
      workedExample(),
      { layerTemplate: 'a-shop-with-a-rather-long-name-{face}-{set}' },
      /would both be on layer A-SHOP-WITH-A-RATHER-LONG-NAME/,
    ],
  ])('%s', (_, particulars, profile, message) => {
    expect(() => names(particulars, profile)).toThrow(LayerClash);
    expect(() => names(particulars, profile)).toThrow(message);
  });
});

test('When two depths of dado round to the same thousandth, then their layers take the digits that tell them apart', () => {
  const named = names(workedExample({ dados: [dado(), dado({ at: 20, depth: 0.2501 })] }), {});
  expect(Object.values(named)).toEqual(expect.arrayContaining(['BACK_DADO_D02500', 'BACK_DADO_D02501']));
});

describe('When a template is checked as it is typed', () => {
  test('then a good one gives an example for each line set that a frame can have', () => {
    const checked = checkLayerTemplate('{face}_{set}');
    expect(checked.ok && checked.example.map((e) => e.name)).toEqual([
      'BACK_DADO',
      'BACK_SQUARING',
      'BACK_BLANK',
      'BACK_LABELS',
      'FRONT_BEAD_INNER',
      'FRONT_BEAD_OUTER',
      'FRONT_QUIRK',
      'FRONT_QUIRK_CORNER',
      'FRONT_OPENING',
      'FRONT_OPENING_AXIS',
      'FRONT_CORNER_LIFT',
      'FRONT_CORNER_VEE',
      'FRONT_PERIMETER',
      'FRONT_BLANK',
      'FRONT_LABELS',
    ]);
  });

  test.each([
    ['{face}', /back\/DADO and back\/SQUARING would both be on layer BACK/],
    ['{set}', /back\/BLANK and front\/BLANK/],
    ['{face}_{cutter}', /would both be on layer/],
    ['{face}_{tool}', /\{face\}, \{set\}, \{cutter\} and \{depth\} in braces, not \{tool\}/],
    ['{face_{set}', /not \{/],
    ['', /not empty/],
    ['---', /not empty/],
    ['0', /"0"/],
  ])('then %j is refused with what it takes', (template, takes) => {
    const checked = checkLayerTemplate(template);
    expect(checked.ok).toBe(false);
    if (!checked.ok) expect(checked.takes).toMatch(takes);
  });

  test('then whatever is typed, each name of the example can be a layer in any program, or the template is refused', () => {
    fc.assert(
      fc.property(
        fc.array(
          fc.oneof(
            fc.string({ unit: 'grapheme', maxLength: 6 }),
            fc.constantFrom('{face}', '{set}', '{cutter}', '{depth}'),
          ),
          { maxLength: 6 },
        ),
        (parts) => {
          const checked = checkLayerTemplate(parts.join(''));
          if (!checked.ok) return checked.takes !== '';
          const all = checked.example.map((e) => e.name);
          return (
            all.every((n) => /^[A-Z0-9_-]{1,31}$/.test(n)) &&
            new Set(all.map((n) => n.toLowerCase())).size === all.length
          );
        },
      ),
      { numRuns: 300 },
    );
  });
});

test('When a name is made, then marks fall off letters and all else becomes an underscore', () => {
  expect(layerName(' Ünter {face}: größe/{set}! ', { face: 'back', set: 'DADO', cutter: '', depth: '' })).toBe(
    'UNTER_BACK_GROSSE_DADO',
  );
});
