import { Injectable } from '@nestjs/common';
import { InjectRepository } from '@nestjs/typeorm';
import type { EntityManager, Repository } from 'typeorm';
import { type Account, toAccount } from './account.js';
import { User } from './entities/user.entity.js';

@Injectable()
export class UsersService {
  constructor(@InjectRepository(User) private readonly users: Repository<User>) {}

  async findByEmail(email: string): Promise<Account | null> {
    const user = await this.users.findOneBy({ email });
    return user && toAccount(user);
  }

  /** Makes an account whose address is known to be the person's own; answers its id. */
  async create(manager: EntityManager, account: Omit<Account, 'id'>): Promise<number> {
    const { identifiers } = await manager.insert(User, account);
    return identifiers[0].id as number;
  }
}
