import { compare, hash } from 'bcryptjs';

const COST = 10;
const DUMMY_HASH = hash('nobody’s password', COST);

export function hashPassword(password: string): Promise<string> {
  return hash(password, COST);
}

/** Takes as long for an account that doesn't exist (null) as for a wrong password. */
export async function passwordMatches(password: string, passwordHash: string | null): Promise<boolean> {
  const matches = await compare(password, passwordHash ?? (await DUMMY_HASH));
  return matches && passwordHash !== null;
}
