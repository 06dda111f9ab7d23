/** One thing that was looked at in the files read back: what the files hold and what was intended. */
export interface ProofCheck {
  readonly name: string;
  readonly ok: boolean;
  readonly got: string;
  readonly wanted: string;
}

/** The files of a layer set read back and held against the intended geometry. Nobody may download a set whose proof failed. */
export interface Proof {
  /** True when every check holds. */
  readonly ok: boolean;
  readonly checks: readonly ProofCheck[];
}
