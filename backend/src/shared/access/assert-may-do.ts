import { type Action, ACTIONS, refusalOf } from '@roothertz/common/access';
import { DomainError } from '../errors/domain-error.js';
import type { Caller } from './caller.js';

/** Refuses a caller whose session, roles or plan don't allow an action. */
export function assertMayDo(caller: Caller | undefined, action: Action): asserts caller is Caller {
  if (caller === undefined) throw new DomainError('session.missing', 'Sign in first.');
  const refusal = refusalOf(caller, action);
  if (refusal !== null) throw new DomainError(`access.${refusal}`, REFUSED[refusal](caller, action));
}

const REFUSED = {
  role: (_: Caller, action: Action) => `This needs one of the roles: ${rolesFor(action)}.`,
  plan: ({ standing }: Caller) =>
    `${standing === 'trial-over' ? 'The trial is over, and the' : 'The'} Free plan doesn’t include this: a team admin can start the Team plan under Plan. What the team has stays readable.`,
  'read-only': ({ standing }: Caller) =>
    `The team’s plan ${standing === 'unpaid' ? 'is unpaid' : 'is cancelled'}: everything can be read and exported, and nothing changed until a team admin ${standing === 'unpaid' ? 'pays what is open' : 'starts the plan again'} under Plan.`,
};

function rolesFor(action: Action): string {
  return [...ACTIONS[action].roles].join(', ');
}
