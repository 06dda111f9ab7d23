import { useState } from 'react';
import { PLAIN_TRACE, type TraceOptions } from '#shared/kernel/tracing/traced-drawing.ts';
import { useReading } from '../api/read-drawing.ts';
import { carryOver, startReview, type Review } from './review.ts';

interface Shown {
  /** What it was read with. */
  readonly options: TraceOptions;
  readonly review: Review;
}

/**
 * A drawing under review: how it is to be read, the last reading that came, and what was said of it. While another reading is
 * under way, and when it fails, the last one stays; what was said of it goes over to the next.
 */
export function useDrawingReview(tracingId: string) {
  const [options, setOptions] = useState<TraceOptions>(PLAIN_TRACE);
  const [shown, setShown] = useState<Shown | null>(null);
  const reading = useReading(tracingId, options);
  const { data } = reading;
  if (data !== undefined && data !== shown?.review.drawing) {
    setShown({ options, review: shown ? carryOver(shown.review, data) : startReview(data) });
  }
  return {
    /** As asked for. */
    options,
    setOptions,
    shown,
    setReview: (change: (review: Review) => Review) =>
      setShown((now) => (now ? { ...now, review: change(now.review) } : now)),
    isReading: reading.isFetching,
    error: reading.isFetching ? null : reading.error,
    readAgain: () => void reading.refetch(),
    /** Gives up the reading under way; null when there is none to go back to. */
    goBack: shown === null ? null : () => setOptions(shown.options),
  };
}
