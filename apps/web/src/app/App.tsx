import { ChakraProvider } from '@chakra-ui/react';
import { RouterProvider } from 'react-router-dom';
import { paths } from '@thudline/contracts';
import { mutate, SWRConfig } from 'swr';
import { ApiError } from '../lib/apiClient';
import { system } from '../theme/system';
import { router } from './router';

/** An answer such as "not found" stays the same when asked again; only lost connections are retried. */
const shouldRetry = (error: unknown) => error instanceof ApiError && error.code === 'offline';

/** A session that ended elsewhere: who was signed in is a guest now, and is asked to sign in. */
const leaveWhenSessionEnded = (error: unknown) => {
  if (error instanceof ApiError && error.code === 'not-signed-in')
    void mutate(paths.me, null, { revalidate: false });
};

export function App() {
  return (
    <ChakraProvider value={system}>
      <SWRConfig
        value={{ shouldRetryOnError: shouldRetry, onError: leaveWhenSessionEnded, revalidateOnFocus: false }}
      >
        <RouterProvider router={router} />
      </SWRConfig>
    </ChakraProvider>
  );
}
