import { useMutation, useQueryClient } from '@tanstack/react-query';
import { App, Button } from 'antd';
import { closeOffer, type Offer, reopenOffer } from '../../api/prices';
import { detailOf } from '../../api/problem';

const SECONDS_TO_UNDO = 12;

/** Closes an offer at once and offers to open it again. */
export function useCloseOffer() {
  const queryClient = useQueryClient();
  const { notification } = App.useApp();
  const onSettled = () => queryClient.invalidateQueries();
  const fail = (title: string) => (error: Error) =>
    notification.error({ title, description: detailOf(error), placement: 'bottomRight' });
  const reopen = useMutation({
    mutationFn: reopenOffer,
    onSuccess: (_opened, { id }) => notification.destroy(id),
    onError: fail('The offer can’t be opened again'),
    onSettled,
  });
  return useMutation({
    mutationFn: closeOffer,
    onSuccess: (_nothing, offer: Offer) =>
      notification.open({
        key: offer.id,
        title: `The offer of ${offer.supplier.name} for ${offer.part.partNumber} is closed`,
        description: 'Its prices stay in the history.',
        duration: SECONDS_TO_UNDO,
        placement: 'bottomRight',
        actions: <Button onClick={() => reopen.mutate(offer)}>Undo</Button>,
      }),
    onError: fail('The offer isn’t closed'),
    onSettled,
  });
}
