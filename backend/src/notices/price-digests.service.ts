import { Injectable, Logger } from '@nestjs/common';
import { InjectDataSource } from '@nestjs/typeorm';
import { refusalOf } from '@roothertz/common/access';
import type { DataSource } from 'typeorm';
import type { Letter } from '../mail/letter.js';
import { MailQueue } from '../mail/mail-queue.service.js';
import { PriceBookService } from '../prices/price-book.service.js';
import { PriceListService } from '../prices/price-list.service.js';
import { PriceSettingsService } from '../prices/price-settings.service.js';
import { isDuplicateEntry } from '../shared/errors/duplicate-entry.js';
import { logFailure } from '../shared/errors/log-failure.js';
import { type Member, toCaller } from '../teams/member.js';
import { TeamsService } from '../teams/teams.service.js';
import { digestLetter, type ListedOffer } from './digest-letter.js';
import { digestWeek } from './digest-week.js';
import { PriceDigest } from './entities/price-digest.entity.js';

/** Offers of each state that are named in a digest. */
const MOST_NAMED = 10;

/** Tells those who keep a team's prices once a week which of them are stale or end soon. */
@Injectable()
export class PriceDigests {
  private readonly logger = new Logger(PriceDigests.name);

  constructor(
    @InjectDataSource() private readonly dataSource: DataSource,
    private readonly prices: PriceBookService,
    private readonly list: PriceListService,
    private readonly settings: PriceSettingsService,
    private readonly teams: TeamsService,
    private readonly mails: MailQueue,
  ) {}

  /** Sends what is due in the week and wasn't sent, however late. */
  async send(now: Date): Promise<void> {
    const week = digestWeek(now);
    const done = await this.dataSource.manager.findBy(PriceDigest, { week });
    const isDone = new Set(done.map(({ teamId }) => teamId));
    for (const teamId of await this.prices.teamsWithOffers())
      if (!isDone.has(teamId))
        await this.sendTo(teamId, week).catch((error: unknown) => this.passOver(error));
  }

  /** The mark of the week and the messages are kept together or not at all. */
  private async sendTo(teamId: number, week: string): Promise<void> {
    const members = recipientsAmong(await this.teams.listMembers(teamId));
    const letter = members.length > 0 ? await this.letterFor(members[0]) : null;
    await this.dataSource.transaction(async (manager) => {
      await manager.insert(PriceDigest, { teamId, week, at: new Date() });
      if (letter === null) return;
      for (const { account } of members) {
        const to = { email: account.email, userId: account.id };
        await this.mails.enqueue(manager, { kind: 'price-digest', to, teamId, letter });
      }
    });
  }

  /** Null where there is nothing to look at. */
  private async letterFor(member: Member): Promise<Letter | null> {
    const caller = toCaller(member);
    const counts = await this.list.count(caller);
    if (counts.stale + counts.expiring === 0) return null;
    const named = async (state: 'stale' | 'expiring', sort: string): Promise<ListedOffer[]> => {
      const { items } = await this.list.list(caller, { state: [state], sort, limit: MOST_NAMED, offset: 0 });
      return items.flatMap(({ part, offer }) => (offer === null ? [] : { ...offer, part }));
    };
    const { staleAfterDays } = await this.settings.find(caller);
    const [expiring, stale] = [await named('expiring', 'validUntil'), await named('stale', 'confirmedAt')];
    return digestLetter({ team: member.team.name, staleAfterDays, counts, expiring, stale });
  }

  /** That another process was quicker is as it should be. */
  private passOver(error: unknown): void {
    if (!isDuplicateEntry(error)) logFailure(this.logger, error);
  }
}

/** Those in purchasing; where there is nobody, the admins. */
function recipientsAmong(members: readonly Member[]): Member[] {
  const keepers = members.filter((member) => refusalOf(member, 'prices.edit') === null);
  const buyers = keepers.filter(({ roles }) => roles.includes('purchasing'));
  return buyers.length > 0 ? buyers : keepers;
}
