import type { ComponentType } from 'react';
import { QueryClient, QueryClientProvider } from '@tanstack/react-query';

/** One cache for what only the server has. Records never go through it: they are read from the phone's own store. */
const client = new QueryClient({
  defaultOptions: { queries: { retry: 1, staleTime: 30_000, refetchOnWindowFocus: false } },
});

/** Gives a page the server queries. Used by the pages that ask the server, so that Field does not load the package. */
export function withServerQueries<Props extends object>(Page: ComponentType<Props>): ComponentType<Props> {
  return function PageWithServerQueries(props: Props) {
    return (
      <QueryClientProvider client={client}>
        <Page {...props} />
      </QueryClientProvider>
    );
  };
}

/** Forgets all answers: at sign-out and when another account opens. */
export function forgetServerAnswers(): void {
  client.clear();
}
