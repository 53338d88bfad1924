import { useQuery } from '@tanstack/react-query';
import type { ReactNode } from 'react';
import { Link } from 'react-router-dom';
import { partQuery, type StoredPart } from '../../api/parts';
import { ApiProblem } from '../../api/problem';
import { MessagePage } from '../../components/MessagePage';
import { PageSkeleton } from '../../components/PageSkeleton';
import type { KindOfPart } from './kindOfPart';

interface LoadedPartProps<Stored extends StoredPart> {
  kind: KindOfPart<Stored>;
  id: string;
  children: (part: Stored) => ReactNode;
}

/** A part by its id, or what to do where there is none. */
export function LoadedPart<Stored extends StoredPart>({ kind, id, children }: LoadedPartProps<Stored>) {
  const { data: part, error } = useQuery(partQuery(kind.reader, id));
  if (part) return children(part);
  if (error instanceof ApiProblem && (error.status === 404 || error.status === 400)) {
    return (
      <MessagePage title="There is no such part">
        <p>
          It may have been deleted. <Link to={kind.path}>See all {kind.noun}s</Link>.
        </p>
      </MessagePage>
    );
  }
  if (error) throw error;
  return <PageSkeleton />;
}
