import type { User } from './entities/user.entity.js';

/** A person's account, with the hash that a password is compared with: it stays inside the server. */
export interface Account {
  id: number;
  email: string;
  name: string;
  passwordHash: string;
}

export function toAccount({ id, email, name, passwordHash }: User): Account {
  return { id, email, name, passwordHash };
}
