import { sessionQuery } from '../features/session/api/get-session.ts';
import { createQueryClient } from '../lib/query-client.ts';

// A call refused for want of a session means that there is none: the layout then asks to sign in again.
export const queryClient = createQueryClient(() => {
  queryClient.setQueryData(sessionQuery.queryKey, (now) => now && { ...now, user: null, shop: null });
});
