import { QueryClientProvider } from '@tanstack/react-query';
import { render } from '@testing-library/react';
import { createMemoryRouter, RouterProvider } from 'react-router-dom';
import { createQueryClient } from '../api/queryClient';
import { ThemeProvider } from '../components/ThemeProvider';
import { routes } from '../routes';

/** Shows the whole application at an address. */
export function renderApp(address: string) {
  const router = createMemoryRouter(routes, { initialEntries: [address] });
  render(
    <ThemeProvider>
      <QueryClientProvider client={createQueryClient()}>
        <RouterProvider router={router} />
      </QueryClientProvider>
    </ThemeProvider>,
  );
  return router;
}
