import { Injectable } from '@nestjs/common';
import { InjectDataSource } from '@nestjs/typeorm';
import type { DataSource } from 'typeorm';
import { type Departure, Departures } from '../teams/departures.service.js';
import { UsersService } from '../users/users.service.js';
import { PasswordCheck } from './password-check.service.js';
import type { SessionCaller } from './session-caller.js';

/** The end of an account: name, address, password and sessions go; what was made in a team stays there. */
@Injectable()
export class CloseAccount {
  constructor(
    @InjectDataSource() private readonly dataSource: DataSource,
    private readonly users: UsersService,
    private readonly departures: Departures,
    private readonly check: PasswordCheck,
  ) {}

  foresee({ userId }: SessionCaller): Promise<Departure[]> {
    return this.departures.foresee(userId);
  }

  async close(caller: SessionCaller, address: string, password: string): Promise<void> {
    await this.check.assert(caller, address, password, 'password');
    await this.dataSource.transaction(async (manager) => {
      await this.departures.leaveAll(manager, caller.userId);
      await this.users.remove(manager, caller.userId);
    });
  }
}
