import type { RankingRequest } from '@roothertz/common/conditions';
import { useMutation, useQuery, useQueryClient } from '@tanstack/react-query';
import {
  createConditions,
  deleteConditions,
  NAMED_CONDITIONS_KEY,
  namedConditionsQuery,
  updateConditions,
  type NamedConditions,
} from '../../api/conditions';
import { sameRequest } from './sameRequest';

export type NamedState = 'unnamed' | 'saved' | 'changed';

/**
 * The team's named conditions, which of them is shown, and what can be done with it.
 *
 * @param partId the part that is chosen on the page; null where none is
 */
export function useNamedConditions(namedId: string | null, request: RankingRequest, partId: string | null) {
  const { data: all } = useQuery(namedConditionsQuery);
  const current = all?.find(({ id }) => id === namedId) ?? null;
  return { all: all ?? [], current, state: stateOf(current, request, partId), ...useNamedMutations() };
}

function stateOf(
  current: NamedConditions | null,
  request: RankingRequest,
  partId: string | null,
): NamedState {
  if (current === null) return 'unnamed';
  const samePart = partId === null || current.partIds.includes(partId);
  return samePart && sameRequest(current, request) ? 'saved' : 'changed';
}

function useNamedMutations() {
  const queryClient = useQueryClient();
  const reload = () => queryClient.invalidateQueries({ queryKey: NAMED_CONDITIONS_KEY });
  const onSettled = reload;
  const create = useMutation({
    mutationFn: ({ name, request, partIds }: CreateVariables) => createConditions(name, request, partIds),
    onSettled,
  });
  const update = useMutation({
    mutationFn: ({ named, changes }: UpdateVariables) => updateConditions(named, changes),
    onSettled,
  });
  const remove = useMutation({ mutationFn: deleteConditions, onSettled });
  return { create, update, remove };
}

interface CreateVariables {
  name: string;
  request: RankingRequest;
  partIds: string[];
}

interface UpdateVariables {
  named: NamedConditions;
  changes: Parameters<typeof updateConditions>[1];
}
