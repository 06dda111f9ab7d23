import { useQuery } from '@tanstack/react-query';
import { tracedDrawing, type ReadingRequest } from '#shared/contracts/tracings.ts';
import type { TraceOptions } from '#shared/kernel/tracing/traced-drawing.ts';
import { callApi } from '../../../lib/call-api.ts';

/** Readings are large: one that nobody looks at is kept for a minute, for stepping back and forth between options. */
const KEPT_MS = 60_000;

/**
 * A drawing as the server reads it with these options. The file never changes, so neither does a reading; one that is no
 * longer looked at is given up on the server too.
 */
export const useReading = (tracingId: string, options: TraceOptions) =>
  useQuery({
    queryKey: ['tracings', tracingId, 'reading', options],
    queryFn: ({ signal }) =>
      callApi({
        method: 'POST',
        path: `/api/tracings/${encodeURIComponent(tracingId)}/reading`,
        body: { options } satisfies ReadingRequest,
        answer: tracedDrawing,
        signal,
      }),
    staleTime: Infinity,
    gcTime: KEPT_MS,
    structuralSharing: false,
  });
