/** Digits that a worked-out length keeps: enough for 1e-9 of any frame, few enough that 0.1 + 0.2 is 0.3. */
const DIGITS = 12;

/** A worked-out length without the noise of floating point sums, so that it reads as a person would have entered it. */
export const tidyLength = (value: number): number => Number(value.toPrecision(DIGITS)) + 0;
