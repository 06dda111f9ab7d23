import type { Particulars } from '#shared/kernel/particulars/particulars.ts';
import type { Finding } from '#shared/kernel/checks/finding.ts';
import type { FileProfile } from '#shared/kernel/profiles/file-profile.ts';
import type { TraceOptions } from '#shared/kernel/tracing/traced-drawing.ts';
import type { TraceFramesInput } from '#shared/kernel/tracing/trace-frames.ts';
import type { Proof } from '#shared/kernel/sheet/proof.ts';
import type { Paper } from '#shared/contracts/session.ts';
import type { JobSetInput } from '../layer-set/build-job-set.ts';
import type { LayerSetInput } from '../layer-set/layer-set.ts';

/** A file ready to be sent. */
export interface MadeFile {
  readonly name: string;
  readonly bytes: Uint8Array;
}

/** What tables and release rules need to know of a frame. */
export interface WorkedSummary {
  readonly width: number;
  readonly height: number;
  readonly openings: number;
  readonly findings: readonly Finding[];
}

/** What a draft's setup sheet says beside the frame itself. */
export interface DraftSheetInput {
  readonly particulars: Particulars;
  readonly shopName: string;
  readonly jobName: string;
  readonly author: string;
  readonly changedAt: string;
  readonly profile: FileProfile;
  readonly paper: Paper;
}

/** Work that would hold up other requests and is done by a worker thread. */
export interface Tasks {
  /** The zip of one revision; fails with the proof when it does not pass. */
  'layer-set': { input: LayerSetInput; result: MadeFile };
  /** One zip for the revisions of a whole job. */
  'job-set': { input: JobSetInput; result: MadeFile };
  /** The setup sheet as it lies in the layer set. */
  'setup-sheet': { input: LayerSetInput; result: MadeFile };
  'draft-sheet': { input: DraftSheetInput; result: MadeFile };
  /** Writes and reads back both DXF files in each of the profiles. */
  proof: { input: { particulars: Particulars; profiles: readonly FileProfile[] }; result: Proof };
  summary: { input: Particulars; result: WorkedSummary };
  /** Somebody's drawing as found and healed, as JSON ready to be sent. Fails with 'drawing-refused'. */
  'read-drawing': { input: { bytes: Uint8Array; options: TraceOptions }; result: string };
  /** The frames that such a drawing holds, with the roles that a person gave its loops. Fails with 'drawing-refused'. */
  'trace-frames': { input: TraceFramesInput; result: Particulars[] };
}

export type TaskKind = keyof Tasks;

/** Makes files and works out frames, away from the thread that answers requests. */
export interface Makers {
  /** Throws 'proof-failed', 'invalid-input' where a profile does not suit the frame, 'too-many-requests' when the queue is full. */
  make<K extends TaskKind>(kind: K, input: Tasks[K]['input'], signal?: AbortSignal): Promise<Tasks[K]['result']>;
  close(): Promise<void>;
}

/** A task on its way to a worker, and what comes back. */
export interface TaskMessage {
  readonly kind: TaskKind;
  readonly input: unknown;
}

export type TaskAnswer =
  | { readonly ok: true; readonly result: unknown }
  | {
      readonly ok: false;
      readonly name: string;
      readonly message: string;
      readonly stack: string;
      /** Why a drawing was refused. */
      readonly code?: string;
      readonly proof?: Proof;
    };
