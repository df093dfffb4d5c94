import { ChakraProvider } from '@chakra-ui/react';
import { render } from '@testing-library/react';
import { createMemoryRouter, RouterProvider, type RouteObject } from 'react-router-dom';
import { SWRConfig } from 'swr';
import { system } from '../theme/system';

/** Puts pages on the screen as the app does, with an empty cache; other addresses only say where one is. */
export function renderPage(routes: RouteObject[], at: string | { pathname: string; state: unknown }) {
  const elsewhere: RouteObject = { path: '*', element: <p>elsewhere</p> };
  const router = createMemoryRouter([...routes, elsewhere], { initialEntries: [at] });
  const view = render(
    <ChakraProvider value={system}>
      <SWRConfig value={{ provider: () => new Map(), shouldRetryOnError: false, dedupingInterval: 0 }}>
        <RouterProvider router={router} />
      </SWRConfig>
    </ChakraProvider>,
  );
  return { ...view, address: () => router.state.location.pathname + router.state.location.search, router };
}
