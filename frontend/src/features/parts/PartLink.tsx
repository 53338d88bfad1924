import type { ICellRendererParams } from 'ag-grid-community';
import { Link } from 'react-router-dom';
import type { StoredPart } from '../../api/parts';
import styles from './PartsGrid.module.css';

export function PartLink({ data, path }: ICellRendererParams<StoredPart> & { path: string }) {
  if (!data) return null;
  return (
    <Link to={`${path}/${data.id}`} tabIndex={-1} className={styles.part} title={data.partNumber}>
      {data.partNumber}
    </Link>
  );
}
