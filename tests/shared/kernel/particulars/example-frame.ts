import { workedExample } from '../../../builders/worked-example.ts';

/** The worked example before its dados are entered. */
export const exampleFrame = workedExample({ dados: [] });
