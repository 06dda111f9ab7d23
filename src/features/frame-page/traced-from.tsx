import type { Frame } from '#shared/contracts/frames.ts';

/** The drawing that a frame came of, as it was uploaded. */
export const TracedFrom = ({ tracing }: { readonly tracing: NonNullable<Frame['tracing']> }) => (
  <p className="mb-3 text-12 text-pencil wrap-anywhere print:hidden">
    Traced from{' '}
    <a
      href={`/api/tracings/${encodeURIComponent(tracing.id)}/file`}
      download={tracing.fileName}
      className="inline-block min-h-6 text-ink underline decoration-pencil underline-offset-4"
    >
      {tracing.fileName}
    </a>
  </p>
);
