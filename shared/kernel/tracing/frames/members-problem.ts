/** Why a traced frame does not become members. `code` is stable. */
export interface MembersProblem {
  readonly code:
    | 'outline-unsound'
    | 'perimeter-no-rectangle'
    | 'opening-no-rectangle'
    | 'no-openings'
    | 'feet-beside-stiles'
    | 'no-layout'
    | 'does-not-agree';
  readonly message: string;
  /** Place of the opening among the traced ones, where it is about one. */
  readonly opening?: number;
}
