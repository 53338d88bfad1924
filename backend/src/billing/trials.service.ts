import { PLAN_LABELS, TRIAL_DAYS } from '@roothertz/common/access';
import { Injectable } from '@nestjs/common';
import { InjectDataSource } from '@nestjs/typeorm';
import type { DataSource } from 'typeorm';
import { AuditService } from '../audit/audit.service.js';
import type { Subscription } from '../plans/entities/subscription.entity.js';
import { PlansService } from '../plans/plans.service.js';
import type { Caller } from '../shared/access/caller.js';
import { DomainError } from '../shared/errors/domain-error.js';

const DAY_MS = 86_400_000;

/** The trial is ours: no card, and nothing of it at the payment service. */
@Injectable()
export class Trials {
  constructor(
    @InjectDataSource() private readonly dataSource: DataSource,
    private readonly plans: PlansService,
    private readonly audit: AuditService,
  ) {}

  async start(caller: Caller): Promise<void> {
    const { teamId } = caller;
    await this.plans.ensure(teamId);
    await this.dataSource.transaction(async (manager) => {
      if (!mayTry(await this.plans.lock(manager, teamId)))
        throw new DomainError('billing.trial-used', 'The team has had its trial, or a plan already.');
      const trialEndsAt = new Date(Date.now() + TRIAL_DAYS * DAY_MS);
      await this.plans.change(manager, teamId, { trialEndsAt });
      await this.audit.record(manager, caller, [
        {
          action: 'plan.trial-started',
          object: { kind: 'plan', id: teamId, label: PLAN_LABELS.team },
          from: null,
          to: { trialEndsAt },
        },
      ]);
    });
  }
}

/** Whether a team may start its one trial. */
export function mayTry(kept: Pick<Subscription, 'status' | 'trialEndsAt'> | null): boolean {
  return (kept?.status ?? null) === null && (kept?.trialEndsAt ?? null) === null;
}
