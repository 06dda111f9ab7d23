import { expect, test } from 'vitest';
import { nextLetter } from '#shared/kernel/revisions/next-letter.ts';

/** Drawing revisions run A, B, C… and skip I, O, Q, S, X, Z; after Y comes AA (ASME Y14.35, from memory). */
test('When revisions are released one after the other, then their letters run as drawings’ do', () => {
  const letters: string[] = [];
  for (let i = 0; i < 44; i++) letters.push(nextLetter(letters.at(-1) ?? ''));
  expect(letters.slice(0, 20).join('')).toBe('ABCDEFGHJKLMNPRTUVWY');
  expect(letters.slice(20, 23)).toEqual(['AA', 'AB', 'AC']);
  expect(letters.slice(38, 42)).toEqual(['AW', 'AY', 'BA', 'BB']);
});

test.each(['a', '1', 'I', 'A1', 'É'])('When the last letter is "%s", which none can be, then that throws', (letter) => {
  expect(() => nextLetter(letter)).toThrow(letter);
});
