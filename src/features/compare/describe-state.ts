/** A state's letter, or "draft", in words. */
export const describeState = (state: string): string => (state === 'draft' ? 'the draft' : `revision ${state}`);
