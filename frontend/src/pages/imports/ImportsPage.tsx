import { useMayDo } from '../../components/useMember';
import { ExportLinks } from '../../features/imports/ExportLinks';
import { History } from '../../features/imports/History';
import { NoOwnLibrary } from '../../features/imports/NoOwnLibrary';
import { UploadList } from '../../features/imports/UploadList';
import styles from './ImportsPage.module.css';

/** The lists that came in, and where the next one is taken. */
export function ImportsPage() {
  const mayImport = useMayDo('lists.import');
  return (
    <div className={styles.page}>
      <title>Import · Roothertz</title>
      <h1>Import</h1>
      {mayImport ? <UploadList /> : <NoOwnLibrary />}
      <section className={styles.history} aria-label="History">
        <h2>What came in</h2>
        <History />
      </section>
      <ExportLinks />
    </div>
  );
}
