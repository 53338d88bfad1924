import { Injectable } from '@nestjs/common';
import { InjectDataSource } from '@nestjs/typeorm';
import type { DataSource, EntityManager } from 'typeorm';
import { AuditService } from '../../audit/audit.service.js';
import { assertPassword } from '../../auth/password-rules.js';
import { hashPassword } from '../../auth/passwords.js';
import type { Caller } from '../../shared/access/caller.js';
import { DomainError } from '../../shared/errors/domain-error.js';
import { duplicateAs } from '../../shared/errors/duplicate-entry.js';
import { UsersService } from '../../users/users.service.js';
import type { TeamResponseDto } from '../dto/team.dto.js';
import { Membership } from '../entities/membership.entity.js';
import { SeatsService } from '../seats.service.js';
import { TeamsService } from '../teams.service.js';
import { type JoinTeamDto, type OpenInvitationDto, toOpenInvitation } from './dto/acceptance.dto.js';
import { Invitation } from './entities/invitation.entity.js';
import { findByToken, holdByToken } from './invitation-select.js';

const refuseKnown = duplicateAs(
  'invitation.account-exists',
  'This address has an account: sign in with it to join.',
);

/** What the holder of an invitation's link can do with it. */
@Injectable()
export class AcceptanceService {
  constructor(
    @InjectDataSource() private readonly dataSource: DataSource,
    private readonly users: UsersService,
    private readonly teams: TeamsService,
    private readonly seats: SeatsService,
    private readonly audit: AuditService,
  ) {}

  async read(token: string): Promise<OpenInvitationDto> {
    const invitation = await findByToken(this.dataSource.manager, token);
    return toOpenInvitation(invitation, (await this.users.findByEmail(invitation.email)) !== null);
  }

  /** The caller joins with the account that is signed in, which must be of the invited address. */
  accept({ userId }: Caller, token: string): Promise<TeamResponseDto> {
    return this.join(token, async (_, { email }) => {
      const account = await this.users.findByEmail(email);
      if (account?.id === userId) return userId;
      throw new DomainError(
        'invitation.other-address',
        'This invitation is for another address: sign out, and open it again.',
      );
    });
  }

  /** A new account joins. */
  async signUp(token: string, { name, password }: JoinTeamDto): Promise<TeamResponseDto> {
    const { email: invited } = await findByToken(this.dataSource.manager, token);
    assertPassword(password, invited, 'password');
    const passwordHash = await hashPassword(password);
    return this.join(token, (manager, { email }) =>
      this.users.create(manager, { email, name, passwordHash }).catch(refuseKnown),
    );
  }

  private async join(
    token: string,
    userFor: (manager: EntityManager, invitation: Invitation) => Promise<number>,
  ): Promise<TeamResponseDto> {
    const { teamId, team } = await findByToken(this.dataSource.manager, token);
    await this.dataSource.transaction(async (manager) => {
      await this.seats.hold(manager, teamId);
      await this.teams.lockTeam(manager, teamId);
      const invitation = await holdByToken(manager, token);
      const userId = await userFor(manager, invitation);
      await this.seats.assertSeat(manager, teamId, invitation.id);
      await manager.update(Invitation, { id: invitation.id }, { acceptedAt: new Date(), openEmail: null });
      await this.addMember(manager, { ...invitation, team }, userId);
    });
    return { id: String(teamId), name: team.name };
  }

  private async addMember(
    manager: EntityManager,
    { teamId, team, roles }: Invitation,
    userId: number,
  ): Promise<void> {
    if (await manager.existsBy(Membership, { userId, teamId }))
      throw new DomainError('invitation.member', 'You are in this team already.');
    await manager.insert(Membership, { userId, teamId, roles });
    const object = { kind: 'team', id: teamId, label: team.name } as const;
    await this.audit.record(manager, { teamId, userId }, [
      { action: 'member.joined', object, from: null, to: { roles } },
    ]);
  }
}
