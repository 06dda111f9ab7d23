import { archedBookcaseStarter } from './arched-bookcase-starter.ts';
import { baseStarter } from './base-starter.ts';
import { cornerPairStarter } from './corner-pair-starter.ts';
import { drawerStackStarter } from './drawer-stack-starter.ts';
import type { Starter } from './starter.ts';
import { tallStarter } from './tall-starter.ts';
import { vanityStarter } from './vanity-starter.ts';
import { wallStarter } from './wall-starter.ts';

/** Frames to begin from, in the order that a person looks for them. */
export const STARTERS: readonly Starter[] = [
  baseStarter,
  drawerStackStarter,
  wallStarter,
  tallStarter,
  cornerPairStarter,
  vanityStarter,
  archedBookcaseStarter,
];
