import { QueryClientProvider } from '@tanstack/react-query';
import { type ReactNode, useState } from 'react';
import { BrowserRouter } from 'react-router-dom';
import { ToastProvider } from '#web/components/ui/toast.tsx';
import { makeQueryClient } from '#web/lib/query-client.ts';

/** What every page may count on: the address, the cache of answers, the live region for news. */
export function Providers({ children }: { readonly children: ReactNode }) {
  const [client] = useState(makeQueryClient);
  return (
    <QueryClientProvider client={client}>
      <BrowserRouter>
        <ToastProvider>{children}</ToastProvider>
      </BrowserRouter>
    </QueryClientProvider>
  );
}
