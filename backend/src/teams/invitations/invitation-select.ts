import { type EntityManager, IsNull, MoreThan, Not } from 'typeorm';
import type { Caller } from '../../shared/access/caller.js';
import { DomainError } from '../../shared/errors/domain-error.js';
import { readId } from '../../shared/ids/read-id.js';
import { Invitation } from './entities/invitation.entity.js';
import { hashOf } from './invitation-token.js';

const RELATIONS = { team: true, invitedBy: true };
const REPLACED = 'A newer invitation took this one’s place: open it from the latest e-mail.';

/** The invitations of a caller's team that nobody has accepted or withdrawn. */
export function findStanding(manager: EntityManager, { teamId }: Caller): Promise<Invitation[]> {
  return manager.find(Invitation, {
    where: { teamId, openEmail: Not(IsNull()) },
    relations: RELATIONS,
    order: { id: 'DESC' },
  });
}

export async function findInvitation(
  manager: EntityManager,
  { teamId }: Caller,
  id: string,
): Promise<Invitation> {
  const where = { teamId, id: readId(id) ?? 0, openEmail: Not(IsNull()) };
  const invitation = await manager.findOne(Invitation, { where, relations: RELATIONS });
  if (invitation === null)
    throw new DomainError('invitation.not-found', 'Your team has no such open invitation.');
  return invitation;
}

/** The invitation that a link is for, where it still stands. */
export async function findByToken(manager: EntityManager, token: string): Promise<Invitation> {
  const where = { tokenHash: hashOf(token) };
  const invitation = await manager.findOne(Invitation, { where, relations: RELATIONS });
  if (invitation === null) throw unknownLink();
  await assertStands(manager, invitation);
  return invitation;
}

/** As {@link findByToken}, held until the transaction ends: of several who accept at once only one gets it. */
export async function holdByToken(manager: EntityManager, token: string): Promise<Invitation> {
  const where = { tokenHash: hashOf(token) };
  const invitation = await manager.findOne(Invitation, { where, lock: { mode: 'pessimistic_write' } });
  if (invitation === null) throw unknownLink();
  await assertStands(manager, invitation);
  return invitation;
}

function unknownLink(): DomainError {
  return new DomainError(
    'invitation.not-found',
    'This link isn’t whole, or a newer one took its place: open it from the latest e-mail.',
  );
}

/** @throws saying why the invitation is of no use; where a newer one stands, that it does */
async function assertStands(manager: EntityManager, invitation: Invitation): Promise<void> {
  const fault = faultOf(invitation);
  if (fault === null) return;
  const { teamId, email: openEmail } = invitation;
  const hasNewer = await manager.existsBy(Invitation, { teamId, openEmail, expiresAt: MoreThan(new Date()) });
  throw hasNewer ? new DomainError(fault.code, REPLACED) : fault;
}

function faultOf({ acceptedAt, revokedAt, expiresAt }: Invitation): DomainError | null {
  if (acceptedAt !== null)
    return new DomainError('invitation.used', 'This invitation has been accepted already: sign in.');
  if (revokedAt !== null)
    return new DomainError('invitation.revoked', 'The team has withdrawn this invitation.');
  if (expiresAt <= new Date())
    return new DomainError(
      'invitation.expired',
      'This invitation is too old: ask the team to send it again.',
    );
  return null;
}
