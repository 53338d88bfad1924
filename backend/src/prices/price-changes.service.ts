import { Injectable } from '@nestjs/common';
import { InjectDataSource } from '@nestjs/typeorm';
import type { DataSource, EntityManager } from 'typeorm';
import type { Caller } from '../shared/access/caller.js';
import { PriceSettings } from './entities/price-settings.entity.js';

/** Lets one after the other change a team's prices, each change under a new revision. */
@Injectable()
export class PriceChanges {
  constructor(@InjectDataSource() private readonly dataSource: DataSource) {}

  /**
   * The bump comes first: its lock lets each change see what the one before has left.
   *
   * @param within whose connection holds the transaction
   */
  async run<Result>(
    { teamId }: Caller,
    change: (manager: EntityManager) => Promise<Result>,
    within = this.dataSource.manager,
  ): Promise<Result> {
    await this.makeSettings(teamId);
    return within.transaction(async (manager) => {
      await manager.increment(PriceSettings, { teamId }, 'revision', 1);
      return change(manager);
    });
  }

  private async makeSettings(teamId: number): Promise<void> {
    const { manager } = this.dataSource;
    if (await manager.existsBy(PriceSettings, { teamId })) return;
    await manager.createQueryBuilder().insert().into(PriceSettings).values({ teamId }).orIgnore().execute();
  }
}
