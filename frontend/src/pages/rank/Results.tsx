import {
  EXCLUSION_LABELS,
  nominalNetwork,
  RESISTOR_EXCLUSION_LABELS,
  withNetwork,
} from '@roothertz/common/noise';
import { exclusionsQuery } from '../../api/ranking';
import { resistorExclusionsQuery } from '../../api/resistorRanking';
import type { StageRequest } from '../../api/stages';
import { PlaceFields } from '../../features/conditions/search/PlaceFields';
import { StageSearchFields } from '../../features/conditions/search/StageSearchFields';
import type { useSearchAddress } from '../../features/conditions/search/useSearchAddress';
import { Exclusions } from '../../features/ranking/Exclusions';
import { RankingGrid } from '../../features/ranking/RankingGrid';
import { ResistorGrid } from '../../features/ranking/resistors/ResistorGrid';
import { StageGrid } from '../../features/ranking/stages/StageGrid';
import type { Ranked } from './useRanked';

interface ResultsProps {
  ranked: Ranked;
  search: ReturnType<typeof useSearchAddress>;
  /** A field holds what can't be read. */
  isBlocked: boolean;
  selectedId: string | null;
  onSelect: (id: string) => void;
}

/** The ranking of the chosen view, with the fields that only it has. */
export function Results(props: ResultsProps) {
  const { view } = props.search;
  if (view === 'op-amps') return <OpAmpResults {...props} />;
  if (view === 'stages')
    return (
      <>
        <StageSearchFields {...props.search} />
        <StageResults {...props} />
      </>
    );
  return (
    <>
      <PlaceFields {...props.search} />
      <ResistorResults {...props} />
    </>
  );
}

function OpAmpResults({ ranked: { opAmps }, isBlocked, ...selection }: ResultsProps) {
  const { ranking, isStale, loadMore } = opAmps;
  if (!ranking) return null;
  return (
    <>
      {ranking.items.length > 0 && (
        <RankingGrid
          ranking={ranking}
          isStale={isStale || isBlocked}
          selectedId={selection.selectedId}
          onSelect={selection.onSelect}
          onNearEnd={loadMore}
        />
      )}
      <Exclusions
        query={exclusionsQuery(ranking.request)}
        excluded={ranking.first.excluded}
        labels={EXCLUSION_LABELS}
        path="/parts"
      />
    </>
  );
}

function StageResults({ ranked, isBlocked, selectedId, onSelect }: ResultsProps) {
  const { stages, isStale, loadMore } = ranked.stages;
  if (!stages || stages.first.pairs === 0) return null;
  return (
    <>
      {stages.items.length > 0 && (
        <StageGrid
          stages={stages}
          isStale={isStale || isBlocked}
          selectedId={selectedId}
          onSelect={onSelect}
          onNearEnd={loadMore}
        />
      )}
      <Exclusions
        query={exclusionsQuery(atWantedGain(stages.request))}
        excluded={stages.first.excluded}
        labels={EXCLUSION_LABELS}
        path="/parts"
      />
    </>
  );
}

/** Op-amps are left out of a search for stages as they are at the wanted gain. */
function atWantedGain({ conditions, filter }: StageRequest) {
  return { conditions: withNetwork(conditions, nominalNetwork(conditions)), filter };
}

function ResistorResults({ ranked, isBlocked }: ResultsProps) {
  const { resistors, isStale, loadMore } = ranked.resistors;
  if (!resistors) return null;
  return (
    <>
      {resistors.items.length > 0 && (
        <ResistorGrid resistors={resistors} isStale={isStale || isBlocked} onNearEnd={loadMore} />
      )}
      <Exclusions
        query={resistorExclusionsQuery(resistors.request)}
        excluded={resistors.first.excluded}
        labels={RESISTOR_EXCLUSION_LABELS}
        path="/parts/resistors"
      />
    </>
  );
}
