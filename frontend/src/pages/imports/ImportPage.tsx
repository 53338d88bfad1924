import { Link, useParams } from 'react-router-dom';
import { ApiProblem } from '../../api/problem';
import { MessagePage } from '../../components/MessagePage';
import { PageSkeleton } from '../../components/PageSkeleton';
import { useMayDo } from '../../components/useMember';
import { ImportWork } from '../../features/imports/ImportWork';
import { KINDS } from '../../features/imports/kinds';
import { useImport } from '../../features/imports/useImport';
import styles from './ImportsPage.module.css';

/** One import on one page. */
export function ImportPage() {
  const { id = '' } = useParams();
  const { data: imported, error } = useImport(id);
  const mayEdit = useMayDo(imported ? KINDS[imported.kind].action : 'lists.import');
  if (imported)
    return (
      <div className={styles.page}>
        <title>{`${imported.fileName} · Roothertz`}</title>
        <Link to="/imports" className={styles.back}>
          All imports
        </Link>
        <ImportWork key={imported.id} imported={imported} mayEdit={mayEdit} />
      </div>
    );
  if (error instanceof ApiProblem && (error.status === 404 || error.status === 400))
    return (
      <MessagePage title="There is no such import">
        <p>
          The address may be mistyped. <Link to="/imports">See all imports</Link>.
        </p>
      </MessagePage>
    );
  if (error) throw error;
  return <PageSkeleton />;
}
