import { useMutation, useQueryClient } from '@tanstack/react-query';
import { type Billing, takeBilling } from '../../api/billing';

/** An act after which the team has another plan. */
export function useBillingAct<Given = void>(act: (given: Given) => Promise<Billing>) {
  const queryClient = useQueryClient();
  return useMutation({ mutationFn: act, onSuccess: (billing) => takeBilling(queryClient, billing) });
}

/** An act that goes on at the payment service's own pages. */
export function useLeaveFor<Given = void>(address: (given: Given) => Promise<string>) {
  return useMutation({ mutationFn: address, onSuccess: (url) => window.location.assign(url) });
}
