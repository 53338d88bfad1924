import { Module } from '@nestjs/common';
import { ConditionsModule } from '../conditions/conditions.module.js';
import { LibraryModule } from '../library/library.module.js';
import { MailModule } from '../mail/mail.module.js';
import { PlansModule } from '../plans/plans.module.js';
import { PricesModule } from '../prices/prices.module.js';
import { TeamsModule } from '../teams/teams.module.js';
import { NoticeSchedule } from './notice-schedule.service.js';
import { PartNotices } from './part-notices.service.js';
import { PartWatches } from './part-watches.service.js';
import { PriceDigests } from './price-digests.service.js';

@Module({
  imports: [ConditionsModule, LibraryModule, MailModule, PlansModule, PricesModule, TeamsModule],
  providers: [NoticeSchedule, PartNotices, PartWatches, PriceDigests],
})
export class NoticesModule {}
