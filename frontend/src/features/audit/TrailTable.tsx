import { actorWords, AUDIT_ACTIONS, describeChange, type FieldChange } from '@roothertz/common/audit';
import { Fragment } from 'react';
import type { AuditEntry } from '../../api/audit';
import { moment } from '../../components/moments';
import { Table } from '../../components/Table';
import { ObjectName } from './ObjectName';
import styles from './Trail.module.css';

/** One row an act: when, who, what, and what it changed. */
export function TrailTable({ entries }: { entries: readonly AuditEntry[] }) {
  return (
    <Table stacks className={styles.table}>
      <thead>
        <tr>
          <th scope="col">when</th>
          <th scope="col">who did what</th>
          <th scope="col">from → to</th>
        </tr>
      </thead>
      <tbody>
        {entries.map((entry) => (
          <tr key={entry.id}>
            <td className={styles.when}>
              <time dateTime={entry.at}>{moment(entry.at)}</time>
            </td>
            <th scope="row">
              <strong>{actorWords(entry.by?.name, entry.object.kind)}</strong> {AUDIT_ACTIONS[entry.action]}{' '}
              <ObjectName entry={entry} />
            </th>
            <td>
              <Changes entry={entry} />
            </td>
          </tr>
        ))}
      </tbody>
    </Table>
  );
}

function Changes({ entry: { from, to } }: { entry: AuditEntry }) {
  const changes = describeChange(from, to);
  if (changes.length === 0) return <span className={styles.muted}>–</span>;
  if (from === null || to === null) return <Whole changes={changes} isGone={to === null} />;
  return (
    <ul className={styles.changes}>
      {changes.map((change) => (
        <li key={change.field}>
          <span className={styles.muted}>{change.field}</span>{' '}
          {change.from !== null && <del>{change.from}</del>}
          {change.from !== null && ' → '}
          {change.to === null ? <span className={styles.muted}>nothing</span> : <ins>{change.to}</ins>}
        </li>
      ))}
    </ul>
  );
}

/** What is new, or gone, on one line. */
function Whole({ changes, isGone }: { changes: readonly FieldChange[]; isGone: boolean }) {
  const Value = isGone ? 'del' : 'ins';
  return (
    <p className={styles.changes}>
      {changes.map(({ field, from, to }, index) => (
        <Fragment key={field}>
          {index > 0 && ', '}
          <span className={styles.muted}>{field}</span> <Value>{isGone ? from : to}</Value>
        </Fragment>
      ))}
    </p>
  );
}
