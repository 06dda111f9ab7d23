import { describe, expect, test } from 'vitest';
import { listChanges } from '#shared/kernel/particulars/list-changes.ts';
import { mergeParticulars } from '#shared/kernel/particulars/merge-particulars.ts';
import { newDado } from '#shared/kernel/particulars/new-dado.ts';
import type { Particulars } from '#shared/kernel/particulars/particulars.ts';
import { setField } from '#shared/kernel/particulars/set-field.ts';
import { exampleFrame as base } from './example-frame.ts';

const change = (from: Particulars, changes: Record<string, unknown>): Particulars =>
  Object.entries(changes).reduce((p, [path, value]) => setField(p, path, value), from);

describe('listChanges', () => {
  test('When nothing differs but identity, then there are none', () => {
    expect(listChanges(base, structuredClone(base))).toEqual([]);
  });

  test('When entries differ, come and go, then each is listed with what it was and is', () => {
    const to = change(base, {
      thickness: 0.5,
      'outline.layout.columns.0.size': 10,
      'outline.layout.columns.1.opening.label': undefined,
    });
    expect(listChanges(base, to)).toEqual([
      { path: 'thickness', from: 0.75, to: 0.5 },
      { path: 'outline.layout.columns.0.size', from: undefined, to: 10 },
      { path: 'outline.layout.columns.1.opening.label', from: 'B', to: undefined },
    ]);
  });

  test('When a list changes its length or a part its kind, then it counts as one entry', () => {
    const to = change(base, { dados: [newDado(base)], 'outline.layout': { opening: {} } });
    expect(listChanges(base, to).map((c) => c.path)).toEqual(['outline.layout', 'dados']);
  });
});

describe('mergeParticulars', () => {
  test('When two people change other entries, then both changes stand', () => {
    const merged = mergeParticulars(
      base,
      change(base, { 'outline.width': 34 }),
      change(base, { 'outline.height': 40 }),
    );
    expect(merged).toEqual({ particulars: change(base, { 'outline.width': 34, 'outline.height': 40 }), leftOut: [] });
  });

  test('When both change one entry, then theirs stands and mine is named as left out', () => {
    const merged = mergeParticulars(
      base,
      change(base, { 'outline.width': 34, thickness: 0.5 }),
      change(base, { 'outline.width': 35 }),
    );
    expect(merged).toEqual({
      particulars: change(base, { 'outline.width': 35, thickness: 0.5 }),
      leftOut: ['outline.width'],
    });
  });

  test('When both change one entry alike, then nothing is left out', () => {
    const both = change(base, { thickness: 0.5 });
    expect(mergeParticulars(base, both, structuredClone(both))).toEqual({ particulars: both, leftOut: [] });
  });

  test('When theirs replaced what holds my entry, then mine is left out', () => {
    const theirs = change(base, { 'outline.layout': { opening: { label: 'All' } } });
    const merged = mergeParticulars(base, change(base, { 'outline.layout.columns.0.size': 10 }), theirs);
    expect(merged).toEqual({ particulars: theirs, leftOut: ['outline.layout.columns.0.size'] });
  });

  test('When I replaced what holds their entry, then theirs stands', () => {
    const theirs = change(base, { 'outline.layout.between': 2 });
    const merged = mergeParticulars(base, change(base, { 'outline.layout': { opening: {} } }), theirs);
    expect(merged).toEqual({ particulars: theirs, leftOut: ['outline.layout'] });
  });
});
