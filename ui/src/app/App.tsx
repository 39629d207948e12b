import { useState } from 'react';
import { createBrowserRouter, RouterProvider } from 'react-router-dom';
import { AppProviders } from './AppProviders';
import { makeQueryClient } from './query-client';
import { routes } from './router';

/** The whole product in a browser. */
export function App() {
  const [queryClient] = useState(() => makeQueryClient());
  const [router] = useState(() => createBrowserRouter(routes));
  return (
    <AppProviders queryClient={queryClient}>
      <RouterProvider router={router} />
    </AppProviders>
  );
}
