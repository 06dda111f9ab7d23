import type { UseQueryResult } from '@tanstack/react-query';
import type { ReactNode } from 'react';
import { isCode } from '../lib/api-error.ts';
import { sayError } from '../lib/say-error.ts';
import { Button } from './button.tsx';
import { ButtonLink } from './button-link.tsx';
import { Empty } from './empty.tsx';
import { Notice } from './notice.tsx';
import { ProgressText } from './progress-text.tsx';

interface FetchedProps<T> {
  readonly query: UseQueryResult<T>;
  /** What is fetched, with its article: "the job". */
  readonly what: string;
  readonly children: (data: T) => ReactNode;
}

/** What a query answered; until then that it is under way, or why there is nothing and what to do. */
export function Fetched<T>({ query, what, children }: FetchedProps<T>) {
  if (query.data !== undefined) return children(query.data);
  if (query.isPending) return <ProgressText>{`Fetching ${what}.`}</ProgressText>;
  if (isCode(query.error, 'not-found')) {
    return (
      <Empty title="Nothing here" actions={<ButtonLink to="/jobs">To the jobs</ButtonLink>}>
        {sayError(query.error)}
      </Empty>
    );
  }
  // An answer that no contract knows is a fault of the product, and belongs to the boundary.
  if (isCode(query.error, 'unexpected-answer')) throw query.error;
  return (
    <Notice
      level="stop"
      word="Not fetched"
      live
      action={<Button onClick={() => void query.refetch()}>Try again</Button>}
    >
      {sayError(query.error)}
    </Notice>
  );
}
