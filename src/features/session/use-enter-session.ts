import { useQueryClient } from '@tanstack/react-query';
import type { Session } from '#shared/contracts/session.ts';
import { sessionQuery } from './api/get-session.ts';

/** Takes a new session over, and forgets what was fetched for the one before: it may be another shop's. */
export function useEnterSession() {
  const client = useQueryClient();
  return (entered: Session) => {
    const before = client.getQueryData(sessionQuery.queryKey);
    client.setQueryData(sessionQuery.queryKey, entered);
    const others = { predicate: (query: { queryKey: readonly unknown[] }) => query.queryKey[0] !== 'session' };
    if (before?.user?.id === entered.user?.id) void client.invalidateQueries(others);
    else client.removeQueries(others);
  };
}
