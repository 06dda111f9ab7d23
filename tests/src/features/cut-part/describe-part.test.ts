import { describe, expect, it } from 'vitest';
import { stepSentence } from '../../../../src/features/cut-part/model/describe-part.ts';
import type { Step } from '../../../../src/features/cut-part/model/steps.ts';

const STEP: Step = {
  key: 'v',
  face: 'front',
  order: 0,
  set: 'CORNER_VEE',
  words: 'Corner V',
  detail: 'V, 30° included; climbs from 12 mm below the face',
};

const say = (area: number, unit: 'in' | 'mm') =>
  stepSentence({ steps: [STEP], done: 1, facts: { loosePieces: 0, marked: { front: [area], back: [] } }, unit });

describe('The sentence of a step', () => {
  it.each([
    [1234, 'mm', '≈12.3 square centimetres'],
    [2.345, 'mm', '≈2.35 square millimetres'],
    [1.5, 'in', '≈1.50 square inches'],
    [0.0042, 'in', '≈0.00420 square inches'],
  ] as const)(
    'When a cut leaves %s of surface in %s, then it is said with digits enough to be seen',
    (area, unit, says) => {
      expect(say(area, unit)).toBe(
        `After step 1 of 1, front, corner V: V, 30° included; climbs from 12 mm below the face. Its surfaces here: ${says}.`,
      );
    },
  );

  it('When nothing of a cut shows, then it is not said that nothing is cut', () => {
    expect(say(0, 'mm')).toContain('Nothing of it shows at this size: upright walls, or too small. Look closer.');
  });
});
