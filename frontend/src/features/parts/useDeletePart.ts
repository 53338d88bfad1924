import { useMutation, useQueryClient } from '@tanstack/react-query';
import { useNavigate } from 'react-router-dom';
import type { StoredPart } from '../../api/parts';
import { detailOf } from '../../api/problem';
import { useUndoNotice } from '../../components/useUndoNotice';
import type { KindOfPart } from './kindOfPart';
import { draftOf } from './partDraft';

/** Deletes a part at once and offers to bring it back. */
export function useDeletePart({ catalogue, reader, create, path }: KindOfPart, part: StoredPart) {
  const queryClient = useQueryClient();
  const navigate = useNavigate();
  const offerUndo = useUndoNotice();
  const undo = async () => {
    const restored = await create(draftOf(catalogue, part));
    await queryClient.invalidateQueries();
    await navigate(`${path}/${restored.id}`);
  };
  return useMutation({
    mutationFn: () => reader.remove(part.id, part.version),
    onSuccess: async () => {
      await navigate(path);
      offerUndo({ key: part.id, title: `${part.partNumber} is deleted`, undo, refused: detailOf });
      await queryClient.invalidateQueries({ predicate: ({ queryKey }) => !queryKey.includes(part.id) });
    },
  });
}
