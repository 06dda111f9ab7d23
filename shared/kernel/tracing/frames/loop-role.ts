import type { Contour } from '../../contour/contour.ts';

/** What a loop of a drawing is on a frame. */
export type LoopRole = 'perimeter' | 'opening' | 'dado' | 'leave-out';

/** A closed loop as healing gives it; without more than a contour it stands alone. */
export interface RoleLoop {
  readonly contour: Contour;
  readonly kind?: 'alone' | 'cell' | 'outline';
  /** Segments of the drawing that it is made of: cells that use one with their outline lie at its edge. */
  readonly segments?: readonly number[];
}

/** Why a loop got the role it got, where that is not plain. */
export type RoleNote = 'inside-an-opening' | 'touches-the-outline' | 'only-round-cells';

export interface GuessedRole {
  readonly role: LoopRole;
  readonly note: RoleNote | null;
}
