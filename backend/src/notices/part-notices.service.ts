import { Injectable, Logger } from '@nestjs/common';
import { InjectDataSource } from '@nestjs/typeorm';
import { isReadOnly, refusalOf } from '@roothertz/common/access';
import { dayOf } from '@roothertz/common/prices';
import type { DataSource, EntityManager } from 'typeorm';
import { ConditionsService } from '../conditions/conditions.service.js';
import { LibraryService } from '../library/library.service.js';
import { MailQueue } from '../mail/mail-queue.service.js';
import { PlansService } from '../plans/plans.service.js';
import { PriceBookService } from '../prices/price-book.service.js';
import { logFailure } from '../shared/errors/log-failure.js';
import type { Member } from '../teams/member.js';
import { TeamsService } from '../teams/teams.service.js';
import { type ChangedPart, partLetter } from './part-letter.js';
import { PartWatches, type Watched } from './part-watches.service.js';
import { changesSince, knownAfter } from './watched-state.js';

/** Tells those who chose parts at saved conditions that these became obsolete, unavailable or dearer. */
@Injectable()
export class PartNotices {
  private readonly logger = new Logger(PartNotices.name);
  /** The state of libraries and prices at which each team was last looked at. */
  private readonly seen = new Map<number, string>();

  constructor(
    @InjectDataSource() private readonly dataSource: DataSource,
    private readonly conditions: ConditionsService,
    private readonly library: LibraryService,
    private readonly prices: PriceBookService,
    private readonly plans: PlansService,
    private readonly teams: TeamsService,
    private readonly watches: PartWatches,
    private readonly mails: MailQueue,
  ) {}

  /** Tells what has changed since it was last told. */
  async send(): Promise<void> {
    for (const teamId of await this.conditions.teamsWithParts())
      await this.lookAt(teamId).catch((error: unknown) => logFailure(this.logger, error));
  }

  /** A team that can't change anything is told once it can again. */
  private async lookAt(teamId: number): Promise<void> {
    const { standing } = await this.plans.stateOf(teamId);
    const state = await this.stateOf(teamId);
    if (isReadOnly(standing) || this.seen.get(teamId) === state) return;
    await this.tell(teamId);
    this.seen.set(teamId, state);
  }

  private async stateOf(teamId: number): Promise<string> {
    const libraries = await this.library.readableLibraries({ teamId });
    const prices = await this.prices.teamOf({ teamId });
    const revisions = [...libraries, prices].map(({ revision }) => revision);
    return [...revisions, dayOf(new Date())].join(' ');
  }

  /** Messages, and what is known after them, are kept together or not at all. */
  private async tell(teamId: number): Promise<void> {
    const members = await this.teams.listMembers(teamId);
    await this.dataSource.transaction(async (manager) => {
      await this.teams.lockTeam(manager, teamId);
      const all = await this.watches.read(manager, { teamId });
      for (const member of members.filter((one) => refusalOf(one, 'conditions.save') === null))
        await this.write(manager, member, all);
      await this.watches.write(manager, all, knownAfter);
    });
  }

  private async write(
    manager: EntityManager,
    { account: { id: userId, email }, team }: Member,
    all: readonly Watched[],
  ): Promise<void> {
    const own = all.filter(({ use }) => use.createdById === userId || use.updatedById === userId);
    const changed = own.flatMap(toChanged);
    if (changed.length === 0) return;
    const letter = partLetter(team.name, changed);
    await this.mails.enqueue(manager, {
      kind: 'part-notice',
      to: { email, userId },
      teamId: team.id,
      letter,
    });
  }
}

function toChanged({ part, use, before, now }: Watched): ChangedPart[] {
  const changes = before === null ? [] : changesSince(before, now);
  return changes.length === 0 ? [] : [{ ...part, conditions: use.name, now, changes }];
}
