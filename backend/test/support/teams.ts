import type { Plan, Role } from '@roothertz/common/access';
import { hash } from 'bcryptjs';
import supertest from 'supertest';
import { SESSION_COOKIE } from '../../src/auth/session-cookie.js';
import { SessionsService } from '../../src/auth/sessions.service.js';
import { seedCuratedLibrary } from '../../src/database/seeds/library-seed.js';
import type { Caller } from '../../src/shared/access/caller.js';
import { Subscription } from '../../src/plans/entities/subscription.entity.js';
import { Membership } from '../../src/teams/entities/membership.entity.js';
import { Team } from '../../src/teams/entities/team.entity.js';
import { TeamsService } from '../../src/teams/teams.service.js';
import { User } from '../../src/users/entities/user.entity.js';
import type { TestApp } from './test-app.js';

export const PASSWORD = 'a password for tests';

const PASSWORD_HASH = hash(PASSWORD, 4);
let people = 0;

export interface TestTeam {
  id: number;
  plan: Plan;
}

export interface TestMember {
  email: string;
  caller: Caller;
  /** Sends every request with the member's session. */
  agent: ReturnType<typeof supertest.agent>;
  /** The header that holds the session. */
  cookie: string;
}

export async function createTeam(app: TestApp, { plan = 'team' as Plan } = {}): Promise<TestTeam> {
  const { id } = await app.dataSource.getRepository(Team).save({ name: 'Weir & Sons' });
  if (plan === 'team')
    await app.dataSource.getRepository(Subscription).insert({ teamId: id, status: 'active', seats: 20 });
  return { id, plan };
}

/** A new person in the team with these roles, signed in. */
export async function signInMember(app: TestApp, team: TestTeam, roles: Role[]): Promise<TestMember> {
  const email = `person${++people}@weir.example`;
  const passwordHash = await PASSWORD_HASH;
  const { id: userId } = await app.dataSource
    .getRepository(User)
    .save({ email, name: `Person ${people}`, passwordHash });
  await app.dataSource.getRepository(Membership).insert({ userId, teamId: team.id, roles });
  const cookie = await sessionCookie(app, userId, team.id);
  const agent = supertest.agent(await app.nest.getUrl()).set('Cookie', cookie);
  return {
    email,
    caller: { userId, teamId: team.id, roles, plan: team.plan, standing: 'active' },
    agent,
    cookie,
  };
}

/** A team's librarian and engineer, and the admin of another team: all read the curated library. */
export async function signInLibraryTeam(app: TestApp) {
  await seedCuratedLibrary(app.dataSource.manager);
  const team = await createTeam(app);
  return {
    librarian: await signInMember(app, team, ['librarian']),
    engineer: await signInMember(app, team, ['engineer']),
    stranger: await signInMember(app, await createTeam(app), ['admin']),
  };
}

async function sessionCookie(app: TestApp, userId: number, teamId: number): Promise<string> {
  const member = await app.nest.get(TeamsService, { strict: false }).findMember(userId, teamId);
  if (member === null) throw new Error('The member was not stored.');
  const token = await app.nest
    .get(SessionsService, { strict: false })
    .begin(member, { address: '127.0.0.1', userAgent: 'tests' });
  return `${SESSION_COOKIE}=${token}`;
}
