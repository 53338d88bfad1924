import type { RankingRequest } from '@roothertz/common/conditions';
import { useQuery } from '@tanstack/react-query';
import { useEffect } from 'react';
import { namedConditionsQuery, type NamedConditions } from '../../api/conditions';
import { exampleRequest } from './exampleRequest';

/** On a visit without an address, shows the team's first named conditions, or an example where it has none. */
export function useStartingConditions(
  isBlank: boolean,
  show: (request: RankingRequest, namedId: string | null, replace: boolean) => void,
): void {
  const { data, isError } = useQuery(namedConditionsQuery);
  const isKnown = data !== undefined || isError;
  useEffect(() => {
    if (!isBlank || !isKnown) return;
    const first = firstOf(data ?? []);
    show(first ?? exampleRequest('non-inverting'), first?.id ?? null, true);
  }, [isBlank, isKnown, data, show]);
}

function firstOf(all: readonly NamedConditions[]): NamedConditions | undefined {
  return [...all].sort((one, other) => Number(one.id) - Number(other.id))[0];
}
