import { useConditionsForm } from '../ConditionsContext';
import { stageKindOf } from '../stageKind';
import { SearchFieldInput } from './SearchFieldInput';
import styles from './SearchFields.module.css';
import { SortChoice } from './SortChoice';
import { canBeParallel, isNetworkLimited } from './stageSearch';
import { TechnologyChoice } from './TechnologyChoice';
import { ToleranceChoice } from './ToleranceChoice';
import type { useSearchAddress } from './useSearchAddress';

type StageSearchFieldsProps = Pick<
  ReturnType<typeof useSearchAddress>,
  'stageSearch' | 'sort' | 'sortBy' | 'technologies' | 'chooseTechnologies' | 'tolerance' | 'limitTolerance'
>;

/** What a search for whole stages asks beside the conditions. */
export function StageSearchFields({ stageSearch: form, ...choices }: StageSearchFieldsProps) {
  const { stage } = useConditionsForm().request.conditions;
  const isFollower = stageKindOf(stage) === 'follower';
  return (
    <div role="group" aria-label="Search for whole stages" className={styles.line}>
      <SortChoice form={form} sort={choices.sort} onSort={choices.sortBy} />
      {!isFollower && <SearchFieldInput form={form} name="gtol" label="gain within" />}
      {!isFollower && isNetworkLimited(stage) && (
        <SearchFieldInput form={form} name="nmax" label="network at most" />
      )}
      {canBeParallel(stage) && <SearchFieldInput form={form} name="par" label="in parallel up to" />}
      {!isFollower && (
        <>
          <ToleranceChoice most={choices.tolerance} onChange={choices.limitTolerance} />
          <TechnologyChoice chosen={choices.technologies} onChange={choices.chooseTechnologies} />
          <span className={styles.label}>
            {stage.topology === 'transimpedance'
              ? 'The feedback resistor is sought near the schematic’s value.'
              : 'Both resistors are sought: the schematic’s don’t count here.'}
          </span>
        </>
      )}
    </div>
  );
}
