import type { WorkedFrame } from '../worked-frame.ts';
import type { SheetBlock, SheetTitleBlock } from './sheet-model.ts';

/** One frame of a job's zip. */
export interface CoverFrame {
  readonly worked: WorkedFrame;
  readonly revision: string;
  /** Its folder in the zip. */
  readonly folder: string;
  /** Names of the files in that folder. */
  readonly files: readonly string[];
}

export interface CoverContext {
  readonly shopName: string;
  readonly jobName: string;
  /** Who had the zip made; '' when nobody in particular. */
  readonly author: string;
  /** ISO date-time: that of the newest revision, so that the same frames give the same sheet. */
  readonly releasedAt: string;
  readonly profileName: string;
  /** Frames of the job that are not in the zip, by name: not released yet. */
  readonly leftOut: readonly string[];
}

/** The cover of a whole job's zip as plain data. */
export interface CoverModel {
  readonly titleBlock: SheetTitleBlock;
  readonly releasedAt: string;
  readonly title: string;
  readonly lead: string;
  readonly blocks: readonly SheetBlock[];
}
