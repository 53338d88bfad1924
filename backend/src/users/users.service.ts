import { Injectable } from '@nestjs/common';
import { InjectRepository } from '@nestjs/typeorm';
import type { EntityManager, Repository } from 'typeorm';
import { type Account, toAccount } from './account.js';
import { User } from './entities/user.entity.js';

export type NewAccount = Omit<Account, 'id'>;

@Injectable()
export class UsersService {
  constructor(@InjectRepository(User) private readonly users: Repository<User>) {}

  async findByEmail(email: string): Promise<Account | null> {
    const user = await this.users.findOneBy({ email });
    return user && toAccount(user);
  }

  async get(id: number): Promise<Account> {
    return toAccount(await this.users.findOneByOrFail({ id }));
  }

  /** Makes an account whose address is confirmed; answers its id. */
  async create(manager: EntityManager, account: NewAccount): Promise<number> {
    const { identifiers } = await manager.insert(User, account);
    return identifiers[0].id as number;
  }

  async change(manager: EntityManager, id: number, changes: Partial<NewAccount>): Promise<void> {
    await manager.update(User, { id }, changes);
  }

  /** Holds the account until the transaction ends. */
  async lock(manager: EntityManager, id: number): Promise<void> {
    await manager.findOneOrFail(User, { where: { id }, lock: { mode: 'pessimistic_write' } });
  }

  /** What the person has made stays. */
  async remove(manager: EntityManager, id: number): Promise<void> {
    await manager.delete(User, { id });
  }
}
