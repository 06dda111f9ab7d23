import { QueryClientProvider } from '@tanstack/react-query';
import { cleanup, render } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import type { ReactElement } from 'react';
import { createMemoryRouter, RouterProvider } from 'react-router';
import { afterEach } from 'vitest';
import { createQueryClient } from '../../src/lib/query-client.ts';

afterEach(cleanup);

// jsdom knows the dialog element but not its opening and closing (tried with 29.1.1); that a modal holds focus is for a real browser to show.
HTMLDialogElement.prototype.showModal = function showModal() {
  this.open = true;
};
HTMLDialogElement.prototype.close = function close() {
  this.open = false;
};

/** Renders an element as the only page of a router, with a query client of its own, and a person who types and clicks. */
export function show(element: ReactElement) {
  const router = createMemoryRouter([{ path: '*', element }]);
  const client = createQueryClient(() => undefined);
  const view = render(
    <QueryClientProvider client={client}>
      <RouterProvider router={router} />
    </QueryClientProvider>,
  );
  return { ...view, router, user: userEvent.setup() };
}
