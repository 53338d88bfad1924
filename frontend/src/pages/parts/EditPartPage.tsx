import { useParams } from 'react-router-dom';
import { useMayDo } from '../../components/useMember';
import { EditPart } from '../../features/parts/EditPart';
import type { KindOfPart } from '../../features/parts/kindOfPart';
import { LoadedPart } from '../../features/parts/LoadedPart';
import { ReadOnlyPage } from '../../features/parts/ReadOnlyPage';
import styles from './PartFormPage.module.css';

export function EditPartPage({ kind }: { kind: KindOfPart }) {
  const { id = '' } = useParams();
  const mayEdit = useMayDo('parts.edit');
  return (
    <LoadedPart kind={kind} id={id}>
      {(part) =>
        mayEdit && part.library === 'team' ? (
          <div className={styles.page}>
            <title>{`Edit ${part.partNumber} · Roothertz`}</title>
            <h1>Edit {part.partNumber}</h1>
            <EditPart key={part.id} kind={kind} part={part} />
          </div>
        ) : (
          <ReadOnlyPage kind={kind} />
        )
      }
    </LoadedPart>
  );
}
