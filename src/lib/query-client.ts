import { QueryClient } from '@tanstack/react-query';

// What the browser believes about the network is not asked: a try says it better.
const networkMode = 'always';

export const queryClient = new QueryClient({
  defaultOptions: {
    queries: { networkMode, staleTime: 60_000, retry: 1, refetchOnWindowFocus: false },
    mutations: { networkMode },
  },
});
