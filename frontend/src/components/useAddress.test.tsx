import { act, render } from '@testing-library/react';
import { createMemoryRouter, RouterProvider } from 'react-router-dom';
import { expect, it } from 'vitest';
import { type Address, useAddress } from './useAddress';

it('doesn’t call off the page that is on its way when something changes the address meanwhile', async () => {
  const shown = {} as { address: Address };
  function Page() {
    Object.assign(shown, { address: useAddress() });
    return null;
  }
  let finish = () => {};
  const loaded = new Promise<{ Component: () => null }>((resolve) => {
    finish = () => resolve({ Component: () => null });
  });
  const router = createMemoryRouter(
    [
      { path: '/rank', element: <Page /> },
      { path: '/imports', lazy: () => loaded },
    ],
    { initialEntries: ['/rank'] },
  );
  render(<RouterProvider router={router} />);
  await act(async () => void router.navigate('/imports'));
  act(() => shown.address.change(() => new URLSearchParams({ stage: 'inverting' }), true));
  await act(async () => finish());
  expect(router.state.location).toMatchObject({ pathname: '/imports', search: '' });
});
