// @vitest-environment jsdom
import { describe, expect, test } from 'vitest';
import { nameLayers } from '#shared/kernel/profiles/name-layers.ts';
import { backDrawing } from '#shared/kernel/sheet/back-drawing.ts';
import { cutterGroups } from '#shared/kernel/sheet/cutter-groups.ts';
import { cutterPicture } from '#shared/kernel/sheet/cutter-picture.ts';
import { sheetDrawingSvg } from '#shared/kernel/sheet/drawing-svg.ts';
import { pictureSvg } from '#shared/kernel/sheet/picture-svg.ts';
import { SHEET_COLOURS } from '#shared/kernel/sheet/sheet-colours.ts';
import { turnPicture } from '#shared/kernel/sheet/turn-picture.ts';
import { workFrame } from '#shared/kernel/work-frame.ts';
import { dado, workedExample } from '../../../builders/worked-example.ts';
import { sheetContext } from './sheet-frames.ts';

const worked = workFrame(workedExample({ dados: [dado({ part: '<b>"End" & \'side\'</b>' })] }));
const svg = sheetDrawingSvg(backDrawing(worked, nameLayers(worked, sheetContext().profile)), {
  width: 186,
  height: 140,
});
const parse = (text: string) => new DOMParser().parseFromString(text, 'image/svg+xml');

describe('sheetDrawingSvg', () => {
  test('It is well-formed, in millimetres of paper, and says what it shows', () => {
    const document = parse(svg);
    expect(document.querySelector('parsererror')).toBeNull();
    expect(document.documentElement.getAttribute('viewBox')).toMatch(/^0 0 186 \d+/);
    expect(document.documentElement.getAttribute('role')).toBe('img');
    expect(document.documentElement.getAttribute('aria-label')).toContain('Back face up');
  });

  test('No element carries a style, so it stands where only style sheets may', () => {
    const all = [
      svg,
      pictureSvg(turnPicture(worked)),
      ...cutterGroups(worked).map((g) => pictureSvg(cutterPicture(g, 'in'))),
    ];
    for (const text of all) {
      const document = parse(text);
      expect(document.querySelector('parsererror')).toBeNull();
      expect(document.querySelectorAll('[style], style, script')).toHaveLength(0);
      expect(document.querySelectorAll('path').length).toBeGreaterThan(2);
    }
  });

  test('What people typed is text and nothing else', () => {
    const document = parse(svg);
    expect(document.querySelector('b')).toBeNull();
    expect([...document.querySelectorAll('text')].map((t) => t.textContent)).toContain('D1 <b>"End" & \'side\'</b>');
  });

  test('Features and line sets are named, so that pointing at one can light it up elsewhere', () => {
    const document = parse(svg);
    expect(document.querySelector('[data-set="back/DADO"]')!.getAttribute('stroke')).toBe(SHEET_COLOURS.back);
    expect(document.querySelectorAll('[data-of~="dado-0"]').length).toBeGreaterThan(2);
  });
});
