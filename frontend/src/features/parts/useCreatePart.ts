import { useMutation, useQueryClient } from '@tanstack/react-query';
import { createOpAmp, opAmpKeys } from '../../api/opAmps';
import { partOf, type PartDraft } from './partDraft';

/** Adding a part to the team's own library. */
export function useCreatePart(onCreated: (id: string) => void) {
  const queryClient = useQueryClient();
  return useMutation({
    mutationFn: (draft: PartDraft) => createOpAmp(partOf(draft)),
    onSuccess: (part) => {
      queryClient.setQueryData(opAmpKeys.one(part.id), part);
      void queryClient.invalidateQueries();
      onCreated(part.id);
    },
  });
}
