import { render } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import { createMemoryRouter } from 'react-router-dom';
import { makeQueryClient } from '../api/queries';
import { App } from '../app/app';
import { routes } from '../app/routes';

/** Opens an address of the product as a person would; the server is what stands at fetch. */
export function openPage(address: string) {
  const router = createMemoryRouter(routes, { initialEntries: [address] });
  const user = userEvent.setup({ delay: null, pointerEventsCheck: 0 });
  const queryClient = makeQueryClient();
  render(<App queryClient={queryClient} router={router} />);
  return {
    user,
    queryClient,
    address: () => router.state.location.pathname + router.state.location.search,
  };
}
