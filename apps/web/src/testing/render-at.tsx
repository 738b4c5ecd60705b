import { QueryClientProvider } from '@tanstack/react-query';
import { render } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import type { ReactNode } from 'react';
import { MemoryRouter } from 'react-router-dom';
import { ToastProvider } from '#web/components/ui/toast.tsx';
import { makeQueryClient } from '#web/lib/query-client.ts';

/** Renders a page or part under an address, with all that the app puts around it. */
export function renderAt(address: string, what: ReactNode) {
  const client = makeQueryClient();
  const user = userEvent.setup();
  const view = render(
    <QueryClientProvider client={client}>
      <MemoryRouter initialEntries={[address]}>
        <ToastProvider>{what}</ToastProvider>
      </MemoryRouter>
    </QueryClientProvider>,
  );
  return { ...view, client, user };
}
