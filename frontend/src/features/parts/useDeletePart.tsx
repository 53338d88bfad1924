import { hashKey, useMutation, useQueryClient } from '@tanstack/react-query';
import { App, Button } from 'antd';
import { useNavigate } from 'react-router-dom';
import { createOpAmp, deleteOpAmp, opAmpKeys, type OpAmp } from '../../api/opAmps';
import { detailOf } from '../../api/problem';
import { draftOf, partOf } from './partDraft';

const SECONDS_TO_UNDO = 12;

/** Deletes a part at once and offers to bring it back. */
export function useDeletePart(part: OpAmp) {
  const queryClient = useQueryClient();
  const navigate = useNavigate();
  const { notification } = App.useApp();
  const undo = async () => {
    notification.destroy(part.id);
    try {
      const restored = await createOpAmp(partOf(draftOf(part)));
      await queryClient.invalidateQueries();
      await navigate(`/parts/${restored.id}`);
    } catch (error) {
      notification.error({ title: `${part.partNumber} can’t be brought back`, description: detailOf(error) });
    }
  };
  return useMutation({
    mutationFn: () => deleteOpAmp(part.id, part.version),
    onSuccess: async () => {
      await navigate('/parts');
      notification.open({
        key: part.id,
        title: `${part.partNumber} is deleted`,
        duration: SECONDS_TO_UNDO,
        placement: 'bottomRight',
        actions: <Button onClick={() => void undo()}>Undo</Button>,
      });
      const gone = hashKey(opAmpKeys.one(part.id));
      await queryClient.invalidateQueries({ predicate: ({ queryHash }) => queryHash !== gone });
    },
  });
}
