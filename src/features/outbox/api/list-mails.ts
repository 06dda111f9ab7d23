import { queryOptions, useQuery } from '@tanstack/react-query';
import { outboxList } from '#shared/contracts/outbox.ts';
import { callApi } from '../../../lib/call-api.ts';

const mailsQuery = queryOptions({
  queryKey: ['outbox'],
  queryFn: ({ signal }) => callApi({ path: '/api/outbox', answer: outboxList, signal }),
  // The server sends mails meanwhile.
  staleTime: 0,
});

/** Mails of the shop, newest first. */
export const useMails = () => useQuery(mailsQuery);
