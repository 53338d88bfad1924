import { Link } from 'react-router-dom';
import { ApiProblem, detailOf } from '../../api/problem';
import { FieldMessage } from '../../components/FieldMessage';

/** Why nobody was invited; without a free seat it leads to where one is added and what it costs is said. */
export function InviteProblem({ error }: { error: Error }) {
  const isSeat = error instanceof ApiProblem && error.status === 402;
  return (
    <FieldMessage>
      {detailOf(error)} {isSeat && <Link to="/team/plan?add">See what a seat more costs</Link>}
    </FieldMessage>
  );
}
