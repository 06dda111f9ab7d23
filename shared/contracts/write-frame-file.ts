import type { Particulars } from '../kernel/particulars/particulars.ts';
import { particulars as contract } from './particulars.ts';

/**
 * The text of a frame file. The same particulars give the same text, whatever the order of their keys:
 * keys stand in the order of the contract. Throws a ZodError for what is no frame file.
 */
export const writeFrameFile = (particulars: Particulars): string => `${JSON.stringify(contract.parse(particulars), null, 2)}\n`;
