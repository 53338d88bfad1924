import { Module } from '@nestjs/common';
import { TypeOrmModule } from '@nestjs/typeorm';
import { AuditModule } from '../audit/audit.module.js';
import { MailModule } from '../mail/mail.module.js';
import { PlansModule } from '../plans/plans.module.js';
import { Departures } from './departures.service.js';
import { Membership } from './entities/membership.entity.js';
import { UsersModule } from '../users/users.module.js';
import { AcceptanceController } from './invitations/acceptance.controller.js';
import { AcceptanceService } from './invitations/acceptance.service.js';
import { InvitationsController } from './invitations/invitations.controller.js';
import { InvitationsService } from './invitations/invitations.service.js';
import { MembersController } from './members.controller.js';
import { MembersService } from './members.service.js';
import { SeatsService } from './seats.service.js';
import { TeamChanges } from './team-changes.service.js';
import { TeamController } from './team.controller.js';
import { TeamSettingsService } from './team-settings.service.js';
import { TeamsService } from './teams.service.js';

@Module({
  imports: [TypeOrmModule.forFeature([Membership]), AuditModule, MailModule, PlansModule, UsersModule],
  controllers: [AcceptanceController, InvitationsController, MembersController, TeamController],
  providers: [
    AcceptanceService,
    Departures,
    InvitationsService,
    MembersService,
    SeatsService,
    TeamChanges,
    TeamSettingsService,
    TeamsService,
  ],
  exports: [Departures, SeatsService, TeamsService],
})
export class TeamsModule {}
