/** Label of the n-th opening (from 0) where none is entered: A to Z, then AA, AB … */
export function openingLabel(index: number): string {
  const letter = String.fromCharCode(65 + (index % 26));
  return index < 26 ? letter : openingLabel(Math.floor(index / 26) - 1) + letter;
}
