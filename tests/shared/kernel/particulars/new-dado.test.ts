import { describe, expect, test } from 'vitest';
import { copyDado } from '#shared/kernel/particulars/copy-dado.ts';
import { newDado } from '#shared/kernel/particulars/new-dado.ts';
import type { Dado, Particulars } from '#shared/kernel/particulars/particulars.ts';
import { exampleFrame } from './example-frame.ts';

const withDados = (dados: readonly Dado[]): Particulars => ({ ...exampleFrame, dados });
const addTimes = (n: number): Particulars => {
  let frame = withDados([]);
  for (let i = 0; i < n; i += 1) frame = withDados([...frame.dados, newDado(frame)]);
  return frame;
};

describe('newDado', () => {
  test('When dados are added one by one, then they are those of the worked example of spec 2: ends, bottom between them', () => {
    const [left, right, bottom] = addTimes(3).dados;
    expect(left).toEqual({
      part: 'Left end',
      runs: 'vertical',
      at: 0.25,
      panel: 0.75,
      clearance: 0.01,
      depth: 0.25,
      from: 0,
      to: 30.5,
      ends: ['open', 'open'],
    });
    expect(right).toMatchObject({ part: 'Right end', runs: 'vertical', at: 32 });
    expect(bottom).toMatchObject({
      part: 'Bottom',
      runs: 'horizontal',
      at: 0.5,
      from: 1,
      to: 32,
      ends: ['meets', 'meets'],
    });
  });

  test('When the box is whole, then partitions follow in the middle, each with a name of its own', () => {
    const frame = addTimes(6);
    expect(frame.dados.map((d) => d.part)).toEqual([
      'Left end',
      'Right end',
      'Bottom',
      'Top',
      'Partition',
      'Partition 2',
    ]);
    expect(frame.dados[4]).toMatchObject({ at: 16.125, from: 1.25, to: frame.dados[3]!.at });
  });

  test('When there is a dado already, then the new one takes its panel, clearance and depth', () => {
    const [left] = addTimes(1).dados;
    expect(newDado(withDados([{ ...left!, panel: 0.5, clearance: 0, depth: 0.2 }]))).toMatchObject({
      panel: 0.5,
      clearance: 0,
      depth: 0.2,
      at: 33 - 0.25 - 0.5,
    });
  });

  test('When the outline is traced, then its extents, arcs included, are spanned', () => {
    const traced: Particulars = {
      ...exampleFrame,
      dados: [],
      outline: {
        kind: 'traced',
        perimeter: [
          [0, 0],
          [20, 0, 1],
          [20, 10],
          [0, 10],
        ],
        openings: [],
      },
    };
    expect(newDado(traced)).toMatchObject({ from: 0, to: 10 });
    expect(newDado({ ...traced, dados: [newDado(traced)] }).at).toBeCloseTo(25 - 0.25 - 0.75, 9);
  });
});

describe('copyDado', () => {
  test('When a dado is copied, then the copy follows it, does not touch it and has another name', () => {
    const frame = addTimes(2);
    const dados = copyDado(frame, 0);
    expect(dados.map((d) => d.part)).toEqual(['Left end', 'Left end 2', 'Right end']);
    expect(dados[1]!.at).toBe(0.25 + 1.5);
  });

  test('When there is none at that place, then it throws', () => {
    expect(() => copyDado(exampleFrame, 0)).toThrow('no dado at 0');
  });
});
