import { Injectable } from '@nestjs/common';
import { InjectDataSource } from '@nestjs/typeorm';
import { dayOf } from '@roothertz/common/prices';
import type { DataSource, EntityManager } from 'typeorm';
import { AuditService } from '../audit/audit.service.js';
import type { Caller } from '../shared/access/caller.js';
import { PriceSettingsDto } from './dto/price-settings.dto.js';
import { PriceSettings } from './entities/price-settings.entity.js';
import type { OfferView } from './offer-response.js';
import { PriceChanges } from './price-changes.service.js';

/** What holds until a team sets something else. */
const DEFAULTS = { currency: 'EUR', staleAfterDays: 90, revision: 0 };

/** What a team has settled for its prices. */
@Injectable()
export class PriceSettingsService {
  constructor(
    @InjectDataSource() private readonly dataSource: DataSource,
    private readonly changes: PriceChanges,
    private readonly audit: AuditService,
  ) {}

  async find(
    { teamId }: Pick<Caller, 'teamId'>,
    manager: EntityManager = this.dataSource.manager,
  ): Promise<Omit<PriceSettings, 'team'>> {
    const settings = await manager.findOneBy(PriceSettings, { teamId });
    return settings ?? { teamId, ...DEFAULTS };
  }

  /** How the team sees an offer today. */
  async view(caller: Caller, manager?: EntityManager): Promise<OfferView> {
    const { staleAfterDays } = await this.find(caller, manager);
    return { staleAfterDays, today: dayOf(new Date()) };
  }

  async read(caller: Caller): Promise<PriceSettingsDto> {
    return toSettingsDto(await this.find(caller));
  }

  change(caller: Caller, dto: PriceSettingsDto): Promise<PriceSettingsDto> {
    const { teamId } = caller;
    return this.changes.run(caller, async (manager) => {
      const before = await this.find(caller, manager);
      const to = toSettingsDto(dto);
      await manager.update(PriceSettings, { teamId }, to);
      const object = { kind: 'price-settings', id: teamId } as const;
      const from = toSettingsDto(before);
      await this.audit.record(manager, caller, [{ action: 'price-settings.changed', object, from, to }]);
      return to;
    });
  }
}

function toSettingsDto({ currency, staleAfterDays }: PriceSettingsDto): PriceSettingsDto {
  return { currency, staleAfterDays };
}
