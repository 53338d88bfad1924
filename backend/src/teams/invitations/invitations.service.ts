import { ROLES } from '@roothertz/common/access';
import { Injectable } from '@nestjs/common';
import { InjectDataSource } from '@nestjs/typeorm';
import type { DataSource, EntityManager } from 'typeorm';
import { MailQueue } from '../../mail/mail-queue.service.js';
import type { Caller } from '../../shared/access/caller.js';
import { DomainError } from '../../shared/errors/domain-error.js';
import { duplicateAs } from '../../shared/errors/duplicate-entry.js';
import type { Roster } from '../roster.js';
import { SeatsService } from '../seats.service.js';
import { TeamChanges } from '../team-changes.service.js';
import {
  type InvitationListDto,
  type InvitationResponseDto,
  type InviteMemberDto,
  toInvitationResponse,
} from './dto/invitation.dto.js';
import { Invitation } from './entities/invitation.entity.js';
import { invitationLetter } from './invitation-letter.js';
import { findInvitation, findStanding } from './invitation-select.js';
import { newInvitationToken } from './invitation-token.js';

const PAUSE_SECONDS = 60;
const MEMBER = 'Somebody with this address is in your team already.';
const INVITED = 'This address is invited already: send that invitation again.';

const refuseDuplicate = duplicateAs('invitation.duplicate', INVITED, [{ field: 'email', message: INVITED }]);

/** Whom a team has invited. */
@Injectable()
export class InvitationsService {
  constructor(
    @InjectDataSource() private readonly dataSource: DataSource,
    private readonly changes: TeamChanges,
    private readonly seats: SeatsService,
    private readonly mails: MailQueue,
  ) {}

  async list(caller: Caller): Promise<InvitationListDto> {
    const standing = await findStanding(this.dataSource.manager, caller);
    return { items: standing.map(toInvitationResponse), total: standing.length };
  }

  async invite(caller: Caller, dto: InviteMemberDto): Promise<InvitationResponseDto> {
    const { email } = dto;
    const roles = ROLES.filter((role) => dto.roles.includes(role));
    let id = 0;
    const change = async (manager: EntityManager, roster: Roster) => {
      refuseMember(roster, email);
      await this.seats.assertSeat(manager, caller.teamId);
      const now = new Date();
      const { token, ...kept } = newInvitationToken(now);
      const { teamId, userId: invitedById } = caller;
      const row = { teamId, email, openEmail: email, roles, invitedById, sentAt: now, ...kept };
      const { identifiers } = await manager.insert(Invitation, row);
      id = identifiers[0].id as number;
      await this.send(manager, caller, roster, { ...row, token });
      const object = { kind: 'invitation', id, label: email } as const;
      return { action: 'invitation.sent' as const, object, from: null, to: { roles } };
    };
    await this.changes.asAdmin(caller, change, { givesSeat: true }).catch(refuseDuplicate);
    return toInvitationResponse(await findInvitation(this.dataSource.manager, caller, String(id)));
  }

  /** Sends the invitation once more, under a new link that is good for another week. */
  async resend(caller: Caller, id: string): Promise<InvitationResponseDto> {
    const change = async (manager: EntityManager, roster: Roster) => {
      const invitation = await findInvitation(manager, caller, id);
      refuseHaste(invitation);
      await this.seats.assertSeat(manager, caller.teamId, invitation.id);
      const now = new Date();
      const { token, ...kept } = newInvitationToken(now);
      await manager.update(Invitation, { id: invitation.id }, { ...kept, sentAt: now });
      const { email, roles } = invitation;
      await this.send(manager, caller, roster, { email, roles, token, expiresAt: kept.expiresAt });
      return { action: 'invitation.resent' as const, object: objectOf(invitation), from: null, to: null };
    };
    await this.changes.asAdmin(caller, change, { givesSeat: true });
    return toInvitationResponse(await findInvitation(this.dataSource.manager, caller, id));
  }

  revoke(caller: Caller, id: string): Promise<void> {
    return this.changes.asAdmin(caller, async (manager) => {
      const invitation = await findInvitation(manager, caller, id);
      await manager.update(Invitation, { id: invitation.id }, { revokedAt: new Date(), openEmail: null });
      const from = { roles: invitation.roles };
      return { action: 'invitation.revoked', object: objectOf(invitation), from, to: null };
    });
  }

  private async send(
    manager: EntityManager,
    { teamId, userId }: Caller,
    roster: Roster,
    { email, ...invited }: Pick<Invitation, 'email' | 'roles' | 'expiresAt'> & { token: string },
  ): Promise<void> {
    const by = roster.member(userId).user.name;
    const letter = invitationLetter({ teamName: roster.team.name, by, ...invited });
    await this.mails.enqueue(manager, { kind: 'invitation', to: { email, userId: null }, teamId, letter });
  }
}

function objectOf({ id, email }: Invitation) {
  return { kind: 'invitation' as const, id, label: email };
}

function refuseMember({ members }: Roster, email: string): void {
  if (members.some(({ user }) => user.email === email))
    throw new DomainError('invitation.member', MEMBER, { errors: [{ field: 'email', message: MEMBER }] });
}

function refuseHaste({ sentAt }: Invitation): void {
  const retryAfter = Math.ceil(PAUSE_SECONDS - (Date.now() - sentAt.getTime()) / 1000);
  if (retryAfter > 0)
    throw new DomainError('request.too-many', `It was just sent: try again in ${retryAfter} s.`, {
      retryAfter,
    });
}
