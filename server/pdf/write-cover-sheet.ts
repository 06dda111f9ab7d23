import type { CoverModel } from '#shared/kernel/sheet/cover-model.ts';
import type { Paper } from './pdf-document.ts';
import { writePages } from './write-pages.ts';

/** The cover of a whole job's zip as a PDF. The same model and paper give the same bytes. Throws RangeError when the model's date is none. */
export const writeCoverSheet = (
  { titleBlock, releasedAt, title, lead, blocks }: CoverModel,
  paper: Paper,
): Promise<Uint8Array> =>
  writePages({ titleBlock, releasedAt, draft: false, pages: [{ title, lead, colour: 'ink', blocks }] }, paper);
