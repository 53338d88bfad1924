import { useQuery } from '@tanstack/react-query';
import type { ReactNode } from 'react';
import { Link } from 'react-router-dom';
import { opAmpQuery, type OpAmp } from '../../api/opAmps';
import { ApiProblem } from '../../api/problem';
import { MessagePage } from '../../components/MessagePage';
import { PageSkeleton } from '../../components/PageSkeleton';

interface LoadedPartProps {
  id: string;
  children: (part: OpAmp) => ReactNode;
}

/** A part by its id, or what to do where there is none. */
export function LoadedPart({ id, children }: LoadedPartProps) {
  const { data: part, error } = useQuery(opAmpQuery(id));
  if (part) return children(part);
  if (error instanceof ApiProblem && (error.status === 404 || error.status === 400)) {
    return (
      <MessagePage title="There is no such part">
        <p>
          It may have been deleted. <Link to="/parts">See all parts</Link>.
        </p>
      </MessagePage>
    );
  }
  if (error) throw error;
  return <PageSkeleton />;
}
