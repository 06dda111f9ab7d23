import type { Particulars } from '#shared/kernel/particulars/particulars.ts';
import type { FileProfile } from '#shared/kernel/profiles/file-profile.ts';
import type { Proof } from '#shared/kernel/sheet/proof.ts';

export interface LayerSetInput {
  readonly particulars: Particulars;
  readonly shopName: string;
  readonly jobName: string;
  /** Letter, or '' for a draft. */
  readonly revision: string;
  readonly author: string;
  /** ISO date-time. */
  readonly releasedAt: string;
  readonly note: string;
  readonly profile: FileProfile;
  readonly paper: 'A4' | 'Letter';
}

export interface LayerSetFile {
  /** In a job's zip with its folder before a slash. */
  readonly name: string;
  readonly bytes: Uint8Array;
}

export interface LayerSet {
  readonly zipName: string;
  readonly files: readonly LayerSetFile[];
  readonly zip: Uint8Array;
  readonly proof: Proof;
}

/** The files do not say what was intended, or could not be written as asked: nobody may have them. */
export class ProofFailed extends Error {
  readonly proof: Proof;

  constructor(frameName: string, proof: Proof) {
    const failed = proof.checks.filter((c) => !c.ok).map((c) => `${c.name}: got ${c.got}, wanted ${c.wanted}`);
    super(`proof of "${frameName}" failed: ${failed.join('; ')}`);
    this.name = 'ProofFailed';
    this.proof = proof;
  }
}
