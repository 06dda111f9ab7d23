import type { FrameRequest } from '#shared/contracts/frames.ts';
import { particulars as schema } from '#shared/contracts/particulars.ts';
import type { Particulars } from '#shared/kernel/particulars/particulars.ts';

/** Particulars of the kernel as the contract takes them. Throws a ZodError when they are none that a frame file may hold. */
export const asFrameRequest = (particulars: Particulars): FrameRequest => ({ particulars: schema.parse(particulars) });
