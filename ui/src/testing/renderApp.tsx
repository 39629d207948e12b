import { render } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import { createMemoryRouter, RouterProvider } from 'react-router-dom';
import { AppProviders } from '@/app/AppProviders';
import { makeQueryClient } from '@/app/query-client';
import { routes } from '@/app/router';
import { keepAccessToken } from '@/lib/access-token';

/**
 * Renders the whole product at an address, with the service played by `fakeService`.
 *
 * @param path address to open.
 * @returns the testing library's result, a user to act with, the router and the cache.
 */
export function renderApp(path = '/') {
  keepAccessToken(null);
  // As in a browser that had a session: the service decides whether it still has one.
  localStorage.setItem('ohmstead-was-here', '1');
  const router = createMemoryRouter(routes, { initialEntries: [path] });
  const user = userEvent.setup();
  const queryClient = makeQueryClient(0);
  const view = render(
    <AppProviders queryClient={queryClient}>
      <RouterProvider router={router} />
    </AppProviders>,
  );
  return { ...view, user, router, queryClient };
}
