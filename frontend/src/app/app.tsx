import type { QueryClient } from '@tanstack/react-query';
import type { createBrowserRouter } from 'react-router-dom';
import { RouterProvider } from 'react-router-dom';
import { Providers } from './providers';

export function App({
  queryClient,
  router,
}: {
  queryClient: QueryClient;
  router: ReturnType<typeof createBrowserRouter>;
}) {
  return (
    <Providers queryClient={queryClient}>
      <RouterProvider router={router} />
    </Providers>
  );
}
