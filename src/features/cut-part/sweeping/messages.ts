import type { FileProfile } from '#shared/kernel/profiles/file-profile.ts';
import type { DrawnFrame } from '#shared/kernel/worked-frame.ts';
import type { Answers, Wish } from './picture.ts';

/** From the page to the worker. A new frame drops all that is still asked about the one before. */
export type ToWorker =
  | { readonly kind: 'frame'; readonly worked: DrawnFrame; readonly profile: FileProfile }
  | { readonly kind: 'ask'; readonly id: number; readonly wish: Wish }
  | { readonly kind: 'cancel'; readonly id: number };

/** Anything that one of the wishes is answered with. */
export type Answer = Answers[keyof Answers];

/** From the worker to the page. `refused`: the frame cannot be drawn, in words; `failed`: a mistake of the program. */
export type FromWorker =
  | { readonly kind: 'progress'; readonly id: number; readonly done: number }
  | { readonly kind: 'answer'; readonly id: number; readonly answer: Answer }
  | { readonly kind: 'refused'; readonly id: number; readonly reason: string }
  | { readonly kind: 'failed'; readonly id: number; readonly message: string };
