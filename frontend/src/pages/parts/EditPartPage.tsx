import { useParams } from 'react-router-dom';
import { useMayDo } from '../../components/useMember';
import { EditPart } from '../../features/parts/EditPart';
import { LoadedPart } from '../../features/parts/LoadedPart';
import { ReadOnlyPage } from '../../features/parts/ReadOnlyPage';
import styles from './PartFormPage.module.css';

export function EditPartPage() {
  const { id = '' } = useParams();
  const mayEdit = useMayDo('parts.edit');
  return (
    <LoadedPart id={id}>
      {(part) =>
        mayEdit && part.library === 'team' ? (
          <div className={styles.page}>
            <title>{`Edit ${part.partNumber} · Roothertz`}</title>
            <h1>Edit {part.partNumber}</h1>
            <EditPart key={part.id} part={part} />
          </div>
        ) : (
          <ReadOnlyPage />
        )
      }
    </LoadedPart>
  );
}
