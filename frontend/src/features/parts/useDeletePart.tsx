import { useMutation, useQueryClient } from '@tanstack/react-query';
import { App, Button } from 'antd';
import { useNavigate } from 'react-router-dom';
import type { StoredPart } from '../../api/parts';
import { detailOf } from '../../api/problem';
import type { KindOfPart } from './kindOfPart';
import { draftOf } from './partDraft';

const SECONDS_TO_UNDO = 12;

/** Deletes a part at once and offers to bring it back. */
export function useDeletePart({ catalogue, reader, create, path }: KindOfPart, part: StoredPart) {
  const queryClient = useQueryClient();
  const navigate = useNavigate();
  const { notification } = App.useApp();
  const undo = async () => {
    notification.destroy(part.id);
    try {
      const restored = await create(draftOf(catalogue, part));
      await queryClient.invalidateQueries();
      await navigate(`${path}/${restored.id}`);
    } catch (error) {
      notification.error({ title: `${part.partNumber} can’t be brought back`, description: detailOf(error) });
    }
  };
  return useMutation({
    mutationFn: () => reader.remove(part.id, part.version),
    onSuccess: async () => {
      await navigate(path);
      notification.open({
        key: part.id,
        title: `${part.partNumber} is deleted`,
        duration: SECONDS_TO_UNDO,
        placement: 'bottomRight',
        actions: <Button onClick={() => void undo()}>Undo</Button>,
      });
      await queryClient.invalidateQueries({ predicate: ({ queryKey }) => !queryKey.includes(part.id) });
    },
  });
}
