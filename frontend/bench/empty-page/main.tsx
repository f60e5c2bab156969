import { QueryClient, QueryClientProvider, useQuery } from '@tanstack/react-query';
import { App, Button, ConfigProvider } from 'antd';
import { StrictMode } from 'react';
import { createRoot } from 'react-dom/client';
import { createBrowserRouter, RouterProvider } from 'react-router-dom';

/** What the product's first page is measured beside: its libraries, set up, with one button between them. */
function Page() {
  const { data, refetch } = useQuery({ queryKey: ['empty'], queryFn: () => Promise.resolve('Empty') });
  return <Button onClick={() => void refetch()}>{data}</Button>;
}

createRoot(document.getElementById('root') as HTMLElement).render(
  <StrictMode>
    <QueryClientProvider client={new QueryClient()}>
      <ConfigProvider>
        <App>
          <RouterProvider router={createBrowserRouter([{ path: '*', element: <Page /> }])} />
        </App>
      </ConfigProvider>
    </QueryClientProvider>
  </StrictMode>,
);
