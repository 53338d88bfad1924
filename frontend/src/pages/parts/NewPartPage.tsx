import { useMayDo } from '../../components/useMember';
import { CreatePart } from '../../features/parts/CreatePart';
import { ReadOnlyPage } from '../../features/parts/ReadOnlyPage';
import styles from './PartFormPage.module.css';

export function NewPartPage() {
  if (!useMayDo('parts.edit')) return <ReadOnlyPage />;
  return (
    <div className={styles.page}>
      <title>New op-amp · Roothertz</title>
      <h1>New op-amp</h1>
      <p className={styles.note}>
        Figures take engineering input such as 4.7 pF, 1.1 nV/√Hz or 10 MHz. Leave out what nobody knows: it
        is shown as unknown, never counted as zero in silence.
      </p>
      <CreatePart />
    </div>
  );
}
