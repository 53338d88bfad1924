import { planState } from '@roothertz/common/access';
import { dayOf } from '@roothertz/common/prices';
import { Injectable } from '@nestjs/common';
import type { EntityManager } from 'typeorm';
import type { Letter } from '../mail/letter.js';
import { MailQueue } from '../mail/mail-queue.service.js';
import { PlansService } from '../plans/plans.service.js';
import { TeamsService } from '../teams/teams.service.js';

/** Tells a team's admins that a payment is missing, and until when everything works all the same. */
@Injectable()
export class FailedPaymentMail {
  constructor(
    private readonly queue: MailQueue,
    private readonly plans: PlansService,
    private readonly teams: TeamsService,
  ) {}

  /** Enqueues nothing where the payment has come meanwhile. */
  async enqueue(manager: EntityManager, teamId: number): Promise<void> {
    const { standing, until } = planState(await this.plans.lock(manager, teamId), new Date());
    if (standing !== 'past-due' && standing !== 'unpaid') return;
    for (const { account, team } of await this.teams.findAdmins(manager, teamId)) {
      const to = { email: account.email, userId: account.id };
      await this.queue.enqueue(manager, {
        kind: 'payment-failed',
        to,
        teamId,
        letter: letter(team.name, until),
      });
    }
  }
}

function letter(team: string, until: Date | null): Letter {
  const consequence =
    until === null
      ? 'The team is read-only now: everything can be read and exported, and nothing changed, until it is paid.'
      : `Everything works until ${dayOf(until)}. From then on the team is read-only: everything can be read and exported, and nothing changed.`;
  return {
    subject: `A payment for ${team} has failed`,
    paragraphs: [
      `The payment for the Team plan of ${team} has failed: the card was declined or has expired.`,
      consequence,
      'Nothing is deleted.',
    ],
    link: { label: 'See to the payment', path: '/team/plan' },
  };
}
