import { useMutation, useQueryClient } from '@tanstack/react-query';
import { useEffect } from 'react';
import { type Billing, takeBilling } from '../../api/billing';

/** An act after which the team has another plan. */
export function useBillingAct<Given = void>(act: (given: Given) => Promise<Billing>) {
  const queryClient = useQueryClient();
  return useMutation({ mutationFn: act, onSuccess: (billing) => takeBilling(queryClient, billing) });
}

/** An act that goes on at the payment service's own pages. */
export function useLeaveFor<Given = void>(address: (given: Given) => Promise<string>) {
  const leaving = useMutation({ mutationFn: address, onSuccess: (url) => window.location.assign(url) });
  const { reset } = leaving;
  useReturn(reset);
  return leaving;
}

/** What to do when the browser's way back shows the page again as it was left, without loading it. */
function useReturn(onReturn: () => void): void {
  useEffect(() => {
    const onShow = ({ persisted }: PageTransitionEvent) => persisted && onReturn();
    window.addEventListener('pageshow', onShow);
    return () => window.removeEventListener('pageshow', onShow);
  }, [onReturn]);
}
