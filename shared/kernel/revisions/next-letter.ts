/** Revision letters of ASME Y14.35 (from memory): I, O, Q, S, X and Z are not used. */
const LETTERS = 'ABCDEFGHJKLMNPRTUVWY';

/** The revision after `letter`; '' gives the first, A. After Y comes AA. Throws for what is no revision letter. */
export function nextLetter(letter: string): string {
  if (letter === '') return 'A';
  const digits = [...letter].map((c) => LETTERS.indexOf(c));
  if (digits.includes(-1))
    throw new RangeError(`revision letter: got ${JSON.stringify(letter)}, takes letters of ${LETTERS}`);
  for (let i = digits.length - 1; i >= 0; i--) {
    if (digits[i]! + 1 < LETTERS.length) {
      digits[i]!++;
      return digits.map((d) => LETTERS[d]).join('');
    }
    digits[i] = 0;
  }
  return LETTERS[0] + digits.map((d) => LETTERS[d]).join('');
}
