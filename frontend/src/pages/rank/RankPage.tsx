import { ApiProblem, detailOf } from '../../api/problem';
import { ContributorPatterns } from '../../components/charts/ContributorPatterns';
import { sharesOf } from '../../components/charts/shares';
import { useMayDo } from '../../components/useMember';
import { ConditionsPanel } from '../../features/conditions/ConditionsPanel';
import { NamedConditionsBar } from '../../features/conditions/NamedConditionsBar';
import { useConditionsAddress } from '../../features/conditions/useConditionsAddress';
import { useFormState } from '../../features/conditions/useFormState';
import { useStartingConditions } from '../../features/conditions/useStartingConditions';
import { useRanking } from '../../features/ranking/useRanking';
import { useSelectedPart } from '../../features/ranking/useSelectedPart';
import { BriefAnswer } from './BriefAnswer';
import styles from './RankPage.module.css';
import { PictureColumn } from './PictureColumn';
import { RankingColumn } from './RankingColumn';
import { Shortcuts } from './Shortcuts';

/** The product's main page: the conditions, the ranking at them, and the picture of the selected part. */
export function RankPage() {
  const address = useConditionsAddress();
  const { isBlank, request, namedId, partId, show, selectPart } = address;
  useStartingConditions(isBlank, show);
  const isRankable = !isBlank && address.problems.blocking.length === 0;
  const { ranking, error, isStale, loadMore } = useRanking(request, isRankable);
  const { form, blockedBy } = useFormState(address, refusedFields(error));
  const selected = useSelectedPart(ranking, partId);
  const note = noteOf(blockedBy, error, ranking !== undefined);
  const maySave = useMayDo('conditions.save');
  return (
    <div className={styles.page}>
      <ContributorPatterns />
      <BriefAnswer ranking={ranking} />
      <section aria-label="Operating conditions" className={styles.conditions}>
        <NamedConditionsBar namedId={namedId} request={request} maySave={maySave} show={show} />
        {!isBlank && (
          <ConditionsPanel
            key={namedId}
            form={form}
            shares={selected && sharesOf(selected.figures.contributions)}
          />
        )}
      </section>
      <RankingColumn
        ranking={ranking}
        isStale={isStale || blockedBy !== null}
        note={note}
        selectedId={selected?.part.id ?? null}
        onSelect={selectPart}
        onNearEnd={loadMore}
      />
      <PictureColumn ranking={ranking} selected={selected} isAwaited={!ranking && note === null} />
      <Shortcuts />
    </div>
  );
}

const NO_FIELDS: ApiProblem['errors'] = [];

function refusedFields(error: Error | null): ApiProblem['errors'] {
  return error instanceof ApiProblem && error.errors.length > 0 ? error.errors : NO_FIELDS;
}

function noteOf(blockedBy: string | null, error: Error | null, hasRanking: boolean): string | null {
  if (blockedBy !== null && hasRanking)
    return `This is the ranking from before: mend “${blockedBy}” to get the new one.`;
  if (blockedBy !== null) return `Nothing is ranked yet: mend “${blockedBy}” first.`;
  return error && (hasRanking ? `This is the ranking from before. ${detailOf(error)}` : detailOf(error));
}
