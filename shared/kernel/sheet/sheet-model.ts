import type { Unit } from '../units/unit.ts';
import type { FileProfile } from '../profiles/file-profile.ts';
import type { PaperPicture } from './paper-picture.ts';
import type { Proof } from './proof.ts';
import type { SheetColour } from './sheet-colours.ts';
import type { SheetDrawing } from './sheet-drawing.ts';

/** What a setup sheet needs to know beside the worked frame. */
export interface SheetContext {
  readonly shopName: string;
  readonly jobName: string;
  /** '' for a draft. */
  readonly revision: string;
  readonly author: string;
  /** ISO date-time. */
  readonly releasedAt: string;
  readonly note: string;
  readonly profile: FileProfile;
  /** null when no files have been written and read back, as for a draft. */
  readonly proof: Proof | null;
}

/** Fields after ISO 7200 (from memory). */
export interface SheetTitleBlock {
  readonly legalOwner: string;
  readonly identification: string;
  readonly title: string;
  readonly documentType: string;
  /** The letter, or 'draft'; '' for what has none of its own, as a cover. */
  readonly revision: string;
  /** Day, as 2026-03-31. */
  readonly dateOfIssue: string;
  readonly createdBy: string;
  /** '' until somebody signs the paper. */
  readonly approvedBy: string;
}

export interface SheetColumn {
  readonly key: string;
  readonly heading: string;
  readonly align: 'left' | 'right';
}

/** A layer's colour as CAD programs show it, or a line as the drawing beside shows it. */
export type SheetSwatch =
  | { readonly kind: 'layer'; readonly hex: string }
  | { readonly kind: 'line'; readonly colour: SheetColour; readonly dashed: boolean };

export interface SheetCell {
  readonly text: string;
  /** The number in `text`, unrounded, in the frame's unit. */
  readonly value?: number;
  readonly swatch?: SheetSwatch;
  readonly bold?: boolean;
  readonly colour?: SheetColour;
}

export interface SheetTable {
  readonly columns: readonly SheetColumn[];
  readonly rows: readonly (readonly SheetCell[])[];
  /** Said instead of an empty table. */
  readonly whenEmpty: string;
}

/** Parts of a page, in reading order. */
export type SheetBlock =
  | { readonly kind: 'drawing'; readonly id: string; readonly title: string; readonly drawing: SheetDrawing }
  | {
      readonly kind: 'pictures';
      readonly id: string;
      readonly title: string;
      readonly pictures: readonly { readonly caption: string; readonly picture: PaperPicture }[];
    }
  | {
      readonly kind: 'table';
      readonly id: string;
      readonly title: string;
      readonly table: SheetTable;
      readonly after: readonly string[];
    }
  | {
      readonly kind: 'list';
      readonly id: string;
      readonly title: string;
      readonly ordered: boolean;
      readonly items: readonly SheetLine[];
      /** May stand beside the page's drawing or first pictures, where that saves room. */
      readonly beside?: boolean;
    }
  | { readonly kind: 'sign-off'; readonly id: string; readonly title: string; readonly boxes: readonly SignOffBox[] };

/** A line of a list; `word` stands before it in bold and in colour ('Stop', 'Caution', 'Note' …). */
export interface SheetLine {
  readonly text: string;
  readonly word?: string;
  readonly colour?: SheetColour;
}

export interface SignOffBox {
  readonly what: 'Drawn' | 'Checked' | 'Cut';
  readonly name: string;
  readonly date: string;
}

export interface SheetPage {
  readonly id: 'back' | 'turn' | 'front' | 'section' | 'cutters';
  /** Back red for the back, front blue for the front, ink otherwise. */
  readonly colour: SheetColour;
  readonly title: string;
  /** The one sentence to read when only one is read. */
  readonly lead: string;
  readonly blocks: readonly SheetBlock[];
}

/** A setup sheet as plain data: what is said, not where it stands on paper. */
export interface SheetModel {
  readonly unit: Unit;
  /** True: marked 'draft, not for cutting' across every page. */
  readonly draft: boolean;
  readonly titleBlock: SheetTitleBlock;
  /** ISO date-time; the only date in the file. */
  readonly releasedAt: string;
  /** Always four: back, turn, front, cutters. */
  readonly pages: readonly SheetPage[];
}
