import { AUDIT_OBJECTS } from '@roothertz/common/audit';
import { Link } from 'react-router-dom';
import type { AuditEntry } from '../../api/audit';
import { objectPath } from './objectPath';

/** What an act was done to, as it was called then, with a link to where it is now. */
export function ObjectName({ entry }: { entry: AuditEntry }) {
  const { kind, label } = entry.object;
  const name = label ?? AUDIT_OBJECTS[kind];
  const path = objectPath(entry);
  return path === null ? <>{name}</> : <Link to={path}>{name}</Link>;
}
