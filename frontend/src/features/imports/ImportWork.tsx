import { type Import, isRunning } from '../../api/imports';
import { Detected } from './Detected';
import styles from './ImportWork.module.css';
import { isDescribable, isMappable } from './importWords';
import { MappingTable } from './MappingTable';
import { Notices } from './Notices';
import { Outcome } from './Outcome';
import { useImportActs } from './useImportActs';
import { useMapping } from './useMapping';
import { Verdicts } from './Verdicts';
import { WorkProgress } from './WorkProgress';

interface ImportWorkProps {
  imported: Import;
  mayEdit: boolean;
}

/** An import: what was detected on top, what the columns are at the left, what would become of the rows at the right. */
export function ImportWork({ imported, mayEdit }: ImportWorkProps) {
  const mapping = useMapping(imported, mayEdit);
  const acts = useImportActs(imported.id);
  const canChange = mayEdit && isDescribable(imported);
  const isStale = isMappable(imported) && mapping.isStale;
  return (
    <>
      <Detected imported={imported} canChange={canChange} onOverrule={mapping.overrule} />
      <div className={styles.work}>
        <MappingTable imported={imported} mapping={mapping} canChange={canChange} />
        <section className={styles.verdicts} aria-label="What becomes of the rows">
          <Notices imported={imported} mapping={mapping} mayEdit={mayEdit} />
          {isRunning(imported) && (
            <WorkProgress
              imported={imported}
              onCancel={mayEdit ? () => acts.cancel.mutate() : undefined}
              isCancelling={acts.cancel.isPending || acts.cancel.isSuccess}
            />
          )}
          <Verdicts imported={imported} isStale={isStale || imported.state === 'checking'} />
          <Outcome imported={imported} acts={acts} mayEdit={mayEdit} isStale={isStale} />
        </section>
      </div>
    </>
  );
}
