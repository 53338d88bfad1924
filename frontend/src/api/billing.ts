import { type QueryClient, queryOptions } from '@tanstack/react-query';
import { answer, client } from './client';
import type { components } from './schema';
import { SESSION_KEY } from './session';

type Schemas = components['schemas'];

export type Billing = Schemas['BillingResponseDto'];
export type Payment = NonNullable<Billing['payment']>;
export type Invoice = Payment['invoices'][number];
export type Money = Schemas['MoneyDto'];
export type SeatPreview = Schemas['SeatPreviewDto'];

const KEY = ['billing'] as const;

/** The team's plan, and what it costs as far as the payment service answers. */
export const billingQuery = queryOptions({
  queryKey: [...KEY, 'plan'],
  queryFn: ({ signal }) => answer(client.GET('/api/billing', { signal })),
});

/** The same after the server has asked the payment service what has become of it. */
export function syncedBillingQuery(queryClient: QueryClient) {
  return queryOptions({
    queryKey: [...KEY, 'synced'],
    queryFn: async () => takeBilling(queryClient, await answer(client.POST('/api/billing/sync'))),
    staleTime: Infinity,
    gcTime: 0,
    retry: false,
  });
}

/** What a change of the number of seats costs; asked anew each time, for it changes with every minute. */
export function seatPreviewQuery(seats: number) {
  return queryOptions({
    queryKey: [...KEY, 'seats', seats],
    queryFn: ({ signal }) => answer(client.POST('/api/billing/seats/preview', { body: { seats }, signal })),
    staleTime: 60_000,
    gcTime: 0,
    retry: false,
  });
}

export function startTrial(): Promise<Billing> {
  return answer(client.POST('/api/billing/trial'));
}

export function changeSeats({ seats, prorationDate }: SeatPreview): Promise<Billing> {
  return answer(client.PUT('/api/billing/seats', { body: { seats, prorationDate } }));
}

/** Where the plan is paid, at the payment service. */
export async function checkoutAddress(seats: number): Promise<string> {
  return (await answer(client.POST('/api/billing/checkout', { body: { seats } }))).url;
}

/** Where card and cancellation are seen to, at the payment service. */
export async function portalAddress(): Promise<string> {
  return (await answer(client.POST('/api/billing/portal'))).url;
}

/** Makes a changed plan known to the page, with all that the member may do now. */
export function takeBilling(queryClient: QueryClient, billing: Billing): Billing {
  queryClient.setQueryData(billingQuery.queryKey, billing);
  void queryClient.invalidateQueries({ queryKey: SESSION_KEY });
  return billing;
}
