import { useMayDo } from '../../components/useMember';
import { CreatePart } from '../../features/parts/CreatePart';
import type { KindOfPart } from '../../features/parts/kindOfPart';
import { ReadOnlyPage } from '../../features/parts/ReadOnlyPage';
import styles from './PartFormPage.module.css';

export function NewPartPage({ kind }: { kind: KindOfPart }) {
  if (!useMayDo('parts.edit')) return <ReadOnlyPage kind={kind} />;
  return (
    <div className={styles.page}>
      <title>{`New ${kind.noun} · Roothertz`}</title>
      <h1>New {kind.noun}</h1>
      <p className={styles.note}>
        Figures take engineering input such as {kind.inputExamples}. Leave out what nobody knows: it is shown
        as unknown, never counted as zero in silence.
      </p>
      <CreatePart kind={kind} />
    </div>
  );
}
