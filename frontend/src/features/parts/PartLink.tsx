import type { ICellRendererParams } from 'ag-grid-community';
import { Link } from 'react-router-dom';
import type { OpAmp } from '../../api/opAmps';
import styles from './PartsGrid.module.css';

export function PartLink({ data }: ICellRendererParams<OpAmp>) {
  if (!data) return null;
  return (
    <Link to={`/parts/${data.id}`} tabIndex={-1} className={styles.part} title={data.partNumber}>
      {data.partNumber}
    </Link>
  );
}
