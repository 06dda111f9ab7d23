import type { SheetModel } from '#shared/kernel/sheet/sheet-model.ts';
import type { Paper } from './pdf-document.ts';
import { writePages } from './write-pages.ts';

/**
 * A setup sheet as a PDF: four pages and as many more as its tables need, drawings to a stated standard scale.
 * The same model and paper give the same bytes. Throws RangeError when the model's date is none.
 */
export const writeSetupSheet = (model: SheetModel, paper: Paper): Promise<Uint8Array> => writePages(model, paper);
