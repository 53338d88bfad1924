import { Link } from 'react-router-dom';
import { ApiProblem, detailOf } from '../../api/problem';
import { FieldMessage } from '../../components/FieldMessage';

/** Why nobody was invited; without a free seat it leads to where one is added. */
export function InviteProblem({ error }: { error: Error }) {
  if (!(error instanceof ApiProblem)) return <FieldMessage>{detailOf(error)}</FieldMessage>;
  const [first] = error.errors;
  return (
    <FieldMessage>
      {first?.message ?? error.detail} {error.status === 402 && <Link to="/team/plan">Go to the plan</Link>}
    </FieldMessage>
  );
}
