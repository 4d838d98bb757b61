'use client';

import { QueryClient, QueryClientProvider } from '@tanstack/react-query';
import { useState, type ReactNode } from 'react';
import { ClientError } from './error';

export function QueryProvider({ children }: { children: ReactNode }) {
  const [client] = useState(makeClient);
  return <QueryClientProvider client={client}>{children}</QueryClientProvider>;
}

function makeClient(): QueryClient {
  return new QueryClient({
    defaultOptions: {
      // Without a connection a call fails at once and says so; it does not wait, unsaid, for the connection to come back.
      queries: { staleTime: 15_000, retry: worthAnotherTry, throwOnError: false, networkMode: 'always' },
      mutations: { retry: false, networkMode: 'always' },
    },
  });
}

/** A refusal stays a refusal; a lost connection or a stumbling server may answer the second time. */
export function worthAnotherTry(failures: number, error: Error): boolean {
  if (error instanceof ClientError && error.status > 0 && error.status < 500) return false;
  return failures < 2;
}
