import { ApiProblem, detailOf } from '../../api/problem';
import { ContributorPatterns } from '../../components/charts/ContributorPatterns';
import { sharesOf } from '../../components/charts/shares';
import { useAddress } from '../../components/useAddress';
import { useMayDo } from '../../components/useMember';
import { ConditionsContext } from '../../features/conditions/ConditionsContext';
import { ConditionsPanel } from '../../features/conditions/ConditionsPanel';
import { NamedConditionsBar } from '../../features/conditions/NamedConditionsBar';
import { WantedGain } from '../../features/conditions/search/WantedGain';
import { useSearchAddress } from '../../features/conditions/search/useSearchAddress';
import { useConditionsAddress } from '../../features/conditions/useConditionsAddress';
import { useFormState } from '../../features/conditions/useFormState';
import { useStartingConditions } from '../../features/conditions/useStartingConditions';
import { AnswerColumn } from './AnswerColumn';
import { BriefAnswer } from './BriefAnswer';
import styles from './RankPage.module.css';
import { PictureColumn } from './PictureColumn';
import { Results } from './Results';
import { Shortcuts } from './Shortcuts';
import { useLookedAt } from './useLookedAt';
import { useRanked, type Address } from './useRanked';

/** The product's main page: the conditions, the ranking at them, and the picture of the selected part. */
export function RankPage() {
  const query = useAddress();
  const address = useConditionsAddress(query);
  const { isBlank, request, namedId, partId, show, replace, selectPart } = address;
  const search = useSearchAddress(query);
  useStartingConditions(isBlank, show);
  const ranked = useRanked(address, search);
  const { error, words, problems } = ranked;
  const { form, blockedBy } = useFormState({ ...address, problems }, refusedFields(error));
  const lookedAt = useLookedAt(ranked, search.view, address);
  const note = noteOf(blockedBy, error, words !== undefined);
  const maySave = useMayDo('conditions.save');
  return (
    <div className={styles.page}>
      <ContributorPatterns />
      <BriefAnswer words={words} />
      <section aria-label="Operating conditions" className={styles.conditions}>
        <NamedConditionsBar
          namedId={namedId}
          request={request}
          chosenId={search.view === 'op-amps' ? partId : null}
          shownId={lookedAt?.selected.part.id ?? null}
          maySave={maySave}
          show={show}
        />
        {!isBlank && (
          <ConditionsPanel
            key={namedId}
            form={form}
            isNetworkSought={search.view === 'stages'}
            shares={lookedAt && sharesOf(lookedAt.selected.figures.contributions)}
            note={search.view !== 'stages' && <WantedNote address={address} />}
          />
        )}
      </section>
      <ConditionsContext value={form}>
        <AnswerColumn view={search.view} onView={address.showView} words={words} note={note}>
          <Results
            ranked={ranked}
            search={search}
            isBlocked={blockedBy !== null}
            selectedId={lookedAt?.selected.part.id ?? null}
            onSelect={selectPart}
          />
        </AnswerColumn>
      </ConditionsContext>
      {search.view !== 'resistors' && (
        <PictureColumn
          lookedAt={lookedAt}
          isAwaited={!words && note === null}
          onChange={replace}
          onSelect={selectPart}
          onTake={address.takeNetwork}
        />
      )}
      <Shortcuts />
    </div>
  );
}

function WantedNote({ address: { wanted, request, showView } }: { address: Address }) {
  if (wanted === null) return null;
  const { stage } = request.conditions;
  return <WantedGain stage={stage} wanted={wanted} onReturn={() => showView('stages')} />;
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
