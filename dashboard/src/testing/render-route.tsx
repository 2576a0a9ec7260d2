import { QueryClient } from '@tanstack/react-query';
import { render } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import { createMemoryRouter, RouterProvider } from 'react-router-dom';
import { AppProvider } from '@/app/provider';
import { routes } from '@/app/router';
import { createQueryClient } from '@/lib/query-client';
import { aSession, aSite } from './builders';
import { answer, serve, type Handler } from './handlers';

/** What every signed-in page asks for; a test's own handlers stand before these. */
const everyPage: Handler[] = [
  answer('GET', '/site', aSite()),
  answer('GET', '/session', aSession()),
  answer('GET', '/stations', []),
];

/** Opens the whole dashboard at an address, with these answers in the network's place. */
export function renderRoute(address: string, handlers: Handler[] = []) {
  serve([...handlers, ...everyPage]);
  const client: QueryClient = createQueryClient();
  client.setDefaultOptions({ queries: { retry: false, staleTime: 0 } });
  const router = createMemoryRouter(routes, { initialEntries: [address] });
  const user = userEvent.setup();
  const view = render(
    <AppProvider client={client}>
      <RouterProvider router={router} />
    </AppProvider>,
  );
  return { ...view, user, router, client };
}
