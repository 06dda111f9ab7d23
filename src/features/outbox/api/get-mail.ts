import { queryOptions, useQuery } from '@tanstack/react-query';
import { openedMail } from '#shared/contracts/outbox.ts';
import { callApi } from '../../../lib/call-api.ts';

const mailQuery = (id: string) =>
  queryOptions({
    queryKey: ['outbox', id],
    queryFn: ({ signal }) => callApi({ path: `/api/outbox/${encodeURIComponent(id)}`, answer: openedMail, signal }),
    staleTime: 0,
  });

/** One mail with its words. */
export const useMail = (id: string) => useQuery(mailQuery(id));
