import { useConditionsForm } from '../ConditionsContext';
import { stageKindOf } from '../stageKind';
import { SearchFieldInput } from './SearchFieldInput';
import styles from './SearchFields.module.css';
import { canBeParallel, isNetworkLimited } from './stageSearch';
import type { StageSearchForm } from './useSearchAddress';

/** What a search for whole stages asks beside the conditions. */
export function StageSearchFields({ form }: { form: StageSearchForm }) {
  const { stage } = useConditionsForm().request.conditions;
  return (
    <div role="group" aria-label="Search for whole stages" className={styles.line}>
      <SearchFieldInput form={form} name="gtol" label="Gain within" />
      {isNetworkLimited(stage) && <SearchFieldInput form={form} name="nmax" label="network at most" />}
      {canBeParallel(stage) && <SearchFieldInput form={form} name="par" label="in parallel up to" />}
      {stageKindOf(stage) !== 'follower' && (
        <span className={styles.label}>
          {stage.topology === 'transimpedance'
            ? 'The feedback resistor is sought near the schematic’s value.'
            : 'Both resistors are sought: the schematic’s don’t count here.'}
        </span>
      )}
    </div>
  );
}
