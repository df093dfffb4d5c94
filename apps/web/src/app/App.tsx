import { ChakraProvider } from '@chakra-ui/react';
import { RouterProvider } from 'react-router-dom';
import { SWRConfig } from 'swr';
import { ApiError } from '../lib/apiClient';
import { system } from '../theme/system';
import { router } from './router';

/** An answer such as "not found" stays the same when asked again; only lost connections are retried. */
const shouldRetry = (error: unknown) => error instanceof ApiError && error.code === 'offline';

export function App() {
  return (
    <ChakraProvider value={system}>
      <SWRConfig value={{ shouldRetryOnError: shouldRetry, revalidateOnFocus: false }}>
        <RouterProvider router={router} />
      </SWRConfig>
    </ChakraProvider>
  );
}
