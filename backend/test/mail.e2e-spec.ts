import { type ChildProcess, spawn } from 'node:child_process';
import { once } from 'node:events';
import { join } from 'node:path';
import { OutboxMail } from '../src/mail/entities/outbox-mail.entity.js';
import { RefusedMail } from '../src/mail/entities/refused-mail.entity.js';
import { type Mail, MailQueue } from '../src/mail/mail-queue.service.js';
import { MailSender } from '../src/mail/mail-sender.service.js';
import { UnsubscribeLinks } from '../src/mail/unsubscribe-links.service.js';
import { testConfig } from './support/database.js';
import { createTeam, signInMember, startTestApp, type TestApp, type TestMember } from './support/index.js';
import { MailServer } from './support/mail-server.js';

/** The built server: the tests are run after a build. */
const MAIN = join(__dirname, '..', 'dist', 'main.js');
const SECRET = { JWT_SECRET: 'a secret that signs the links too' };

describe('e-mail', () => {
  let app: TestApp;
  let member: TestMember;
  let child: ChildProcess | undefined;
  const server = new MailServer();

  beforeAll(async () => {
    app = await startTestApp(SECRET);
    member = await signInMember(app, await createTeam(app), ['purchasing']);
    await server.start();
  });
  beforeEach(async () => {
    await app.dataSource.getRepository(OutboxMail).deleteAll();
    await app.dataSource.getRepository(RefusedMail).deleteAll();
    server.messages.length = 0;
    server.answer = () => '250 kept';
  });
  afterEach(() => void child?.kill('SIGKILL'));
  afterAll(async () => {
    await server.stop();
    await app.close();
  });

  const mailServer = () => ({ SMTP_HOST: '127.0.0.1', SMTP_PORT: String(server.port) });
  const newSender = () =>
    new MailSender(
      app.dataSource,
      testConfig({ ...SECRET, ...mailServer() }),
      app.nest.get(UnsubscribeLinks),
    );
  const outbox = () => app.dataSource.getRepository(OutboxMail).find({ order: { id: 'ASC' } });
  const makeDue = () => app.dataSource.query('UPDATE outbox_mails SET next_attempt_at = NOW(3)');
  const digest = (): Mail => ({
    kind: 'price-digest',
    to: { email: member.email, userId: member.caller.userId },
    teamId: member.caller.teamId,
    letter: { subject: 'Two prices are stale', paragraphs: ['Größe <b>4k7 Ω</b>'] },
  });
  const enqueue = (mail: Mail) =>
    app.dataSource.transaction((manager) => app.nest.get(MailQueue).enqueue(manager, mail));

  it('is stored with the change that it tells of, and not without it', async () => {
    await expect(
      app.dataSource.transaction(async (manager) => {
        await app.nest.get(MailQueue).enqueue(manager, digest());
        throw new Error('the change fails');
      }),
    ).rejects.toThrow('the change fails');
    expect(await outbox()).toEqual([]);
    await enqueue(digest());
    expect(await outbox()).toMatchObject([
      { kind: 'price-digest', to: member.email, teamId: member.caller.teamId, attempts: 0, sentAt: null },
    ]);
  });

  it('is sent after the commit, as HTML and text, and its contents are then forgotten', async () => {
    const sender = newSender();
    jest.spyOn(app.nest.get(MailSender), 'nudge').mockImplementation(() => sender.nudge());
    await enqueue(digest());
    await until(async () => (await outbox())[0].sentAt !== null);
    const [row] = await outbox();
    expect(row).toMatchObject({ attempts: 1, nextAttemptAt: null, failedAt: null, html: null, text: null });
    expect(server.headers('Message-ID')).toEqual([row.messageId]);
    expect(server.headers('To')).toEqual([member.email]);
    expect(server.headers('Subject')).toEqual(['Two prices are stale']);
    expect(server.messages[0]).toMatch(/Content-Type: text\/plain[^]*Content-Type: text\/html/);
    jest.restoreAllMocks();
  });

  it('is sent once by two processes that look at the same time', async () => {
    for (let count = 0; count < 30; count++) await enqueue(digest());
    await Promise.all([newSender().sendDue(), newSender().sendDue()]);
    expect(server.messages).toHaveLength(30);
    expect(new Set(server.headers('Message-ID')).size).toBe(30);
  });

  it('is sent at most once more, under the same Message-ID, when the server is killed before it is marked', async () => {
    await enqueue(digest());
    child = startServer(mailServer());
    server.answer = () => {
      child?.kill('SIGKILL');
      return null;
    };
    await once(child, 'exit');
    expect(await outbox()).toMatchObject([{ attempts: 1, sentAt: null }]);
    server.answer = () => '250 kept';
    await newSender().sendDue();
    expect(server.messages).toHaveLength(1);
    await makeDue();
    await newSender().sendDue();
    await newSender().sendDue();
    const [row] = await outbox();
    expect(row).toMatchObject({ attempts: 2, sentAt: expect.any(Date) });
    expect(server.headers('Message-ID')).toEqual([row.messageId, row.messageId]);
  }, 60_000);

  it('is tried again, later each time, and given up after ten attempts', async () => {
    server.answer = () => '451 not now';
    await enqueue(digest());
    const pauses: number[] = [];
    for (let attempt = 1; attempt <= 10; attempt++) {
      await makeDue();
      await newSender().sendDue();
      const [{ nextAttemptAt }] = await outbox();
      if (nextAttemptAt) pauses.push(Math.round((nextAttemptAt.getTime() - Date.now()) / 60_000));
    }
    expect(pauses).toEqual([2, 4, 8, 16, 32, 64, 128, 256, 360]);
    expect(await outbox()).toMatchObject(
      [{ attempts: 10, sentAt: null, failedAt: expect.any(Date), html: null, lastError: /451 not now/ }].map(
        (row) => ({ ...row, lastError: expect.stringMatching(row.lastError) }),
      ),
    );
  });

  it('is given up at once where the server refuses it for good', async () => {
    server.answer = () => '554 never';
    await enqueue(digest());
    await newSender().sendDue();
    expect(await outbox()).toMatchObject([{ attempts: 1, nextAttemptAt: null, failedAt: expect.any(Date) }]);
  });

  it('names the link by which mail programs stop notices, and stops that kind for that member alone', async () => {
    const other = await signInMember(app, await createTeam(app), ['purchasing']);
    await enqueue(digest());
    await newSender().sendDue();
    expect(server.headers('List-Unsubscribe-Post')).toEqual(['List-Unsubscribe=One-Click']);
    const [link = ''] = server.headers('List-Unsubscribe');
    const { pathname } = new URL(link.slice(1, -1));
    await app.request.get(pathname).expect(200, {
      kind: 'price-digest',
      label: 'Weekly list of stale and expiring prices',
    });
    for (let time = 0; time < 2; time++)
      await app.request.post(pathname).type('form').send('List-Unsubscribe=One-Click').expect(200);
    expect(await app.dataSource.getRepository(RefusedMail).find()).toMatchObject([
      { userId: member.caller.userId, kind: 'price-digest' },
    ]);
    expect(await enqueue(digest())).toBe(false);
    expect(await enqueue({ ...digest(), kind: 'part-notice' })).toBe(true);
    expect(await enqueue({ ...digest(), to: { email: other.email, userId: other.caller.userId } })).toBe(
      true,
    );
    expect((await outbox()).length).toBe(3);
  });

  it('refuses a link that is cut, changed or for a message that can’t be stopped', async () => {
    const links = app.nest.get(UnsubscribeLinks);
    const token = links.tokenFor({ userId: member.caller.userId, kind: 'price-digest' });
    const foreign = token.replace(/^\d+/, String(member.caller.userId + 1));
    const unstoppable = links.tokenFor({ userId: member.caller.userId, kind: 'reset-password' as never });
    for (const wrong of [
      token.slice(0, -1),
      foreign,
      token.replace('price-digest', 'part-notice'),
      unstoppable,
    ]) {
      const answer = await app.request.post(`/api/mail/unsubscribe/${wrong}`).expect(404);
      expect(answer.body.code).toBe('mail.unknown-link');
    }
    expect(await app.dataSource.getRepository(RefusedMail).count()).toBe(0);
  });

  it('lets a member refuse notices and ask for them again', async () => {
    const wanted = async () => {
      const { body } = await member.agent.get('/api/mail/preferences').expect(200);
      return Object.fromEntries(
        body.items.map((item: { kind: string; wanted: boolean }) => [item.kind, item.wanted]),
      );
    };
    const change = (body: object) => member.agent.put('/api/mail/preferences').send(body);
    expect(await wanted()).toEqual({ 'price-digest': true, 'part-notice': true });
    await change({ kind: 'part-notice', wanted: false }).expect(200);
    expect(await wanted()).toEqual({ 'price-digest': true, 'part-notice': false });
    await change({ kind: 'part-notice', wanted: true }).expect(200);
    expect(await app.dataSource.getRepository(RefusedMail).count()).toBe(0);
    const answer = await change({ kind: 'reset-password', wanted: 'no' }).expect(400);
    expect(answer.body.errors.map(({ field }: { field: string }) => field).sort()).toEqual([
      'kind',
      'wanted',
    ]);
  });

  function startServer(environment: Record<string, string>): ChildProcess {
    const { DB_NAME, DB_HOST, DB_PORT, DB_USER, DB_PASSWORD } = app.config;
    const database = { DB_NAME, DB_HOST, DB_PORT: String(DB_PORT), DB_USER, DB_PASSWORD };
    return spawn(process.execPath, [MAIN], {
      env: {
        ...process.env,
        ...SECRET,
        ...database,
        ...environment,
        NODE_ENV: 'test',
        HOST: '127.0.0.1',
        PORT: '0',
      },
      stdio: ['ignore', 'ignore', 'inherit'],
    });
  }
});

async function until(condition: () => Promise<boolean>): Promise<void> {
  while (!(await condition())) await new Promise((resolve) => setTimeout(resolve, 50));
}
