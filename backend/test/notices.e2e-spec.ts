import { addDays, dayOf } from '@roothertz/common/prices';
import { OutboxMail } from '../src/mail/entities/outbox-mail.entity.js';
import { MailSender } from '../src/mail/mail-sender.service.js';
import { UnsubscribeLinks } from '../src/mail/unsubscribe-links.service.js';
import { PartWatch } from '../src/notices/entities/part-watch.entity.js';
import { PriceDigest } from '../src/notices/entities/price-digest.entity.js';
import { NoticeSchedule } from '../src/notices/notice-schedule.service.js';
import { PriceDigests } from '../src/notices/price-digests.service.js';
import { Subscription } from '../src/plans/entities/subscription.entity.js';
import { Offer } from '../src/prices/entities/offer.entity.js';
import { dayText } from '../src/shared/text/day-text.js';
import { Membership } from '../src/teams/entities/membership.entity.js';
import { saveConditions } from './factories/conditions.js';
import { applyList } from './factories/imports.js';
import { createOffer, createSupplier } from './factories/offers.js';
import { createOpAmp } from './factories/op-amps.js';
import { testConfig } from './support/database.js';
import {
  createTeam,
  signInMember,
  startTestApp,
  type TestApp,
  type TestMember,
  type TestTeam,
} from './support/index.js';
import { MailServer } from './support/mail-server.js';

/** A Tuesday. */
const NOW = new Date('2026-12-01T12:00:00Z');
const DAY_MS = 86_400_000;
const later = (days: number) => new Date(NOW.getTime() + days * DAY_MS);

describe('notices', () => {
  let app: TestApp;
  let team: TestTeam;
  let buyer: TestMember;
  let librarian: TestMember;
  let engineer: TestMember;

  beforeAll(async () => {
    app = await startTestApp();
  });
  beforeEach(async () => {
    await app.dataSource.getRepository(Offer).deleteAll();
    team = await createTeam(app);
    buyer = await signInMember(app, team, ['purchasing']);
    librarian = await signInMember(app, team, ['admin', 'librarian']);
    engineer = await signInMember(app, team, ['engineer']);
  });
  afterEach(() => app.dataSource.getRepository(OutboxMail).deleteAll());
  afterAll(() => app.close());

  const look = (now = NOW) => app.nest.get(NoticeSchedule).sendDue(now);
  const mails = () => app.dataSource.getRepository(OutboxMail).find({ order: { id: 'ASC' } });
  const recipients = async () => (await mails()).map(({ to }) => to);
  /** The lines of the lists in the messages that have been written since this was last asked. */
  const told = async () => {
    const lines = (await mails()).flatMap(({ text }) => text!.match(/^- .*$/gm) ?? []);
    await app.dataSource.getRepository(OutboxMail).deleteAll();
    return lines.map((line) => line.slice(2));
  };
  const refuse = (member: TestMember, kind: string) =>
    member.agent.put('/api/mail/preferences').send({ kind, wanted: false }).expect(200);
  const setPlan = (changes: Partial<Subscription>) =>
    app.dataSource.getRepository(Subscription).update({ teamId: team.id }, changes);

  async function offered(changes: Record<string, unknown> = {}, part: Record<string, unknown> = {}) {
    const { id: partId } = await createOpAmp(librarian, part);
    const { id: supplierId } = await createSupplier(buyer);
    const offer = await createOffer(buyer, { partId, supplierId }, changes);
    return { partId, offer };
  }

  describe('of prices', () => {
    const makeStale = ({ offer }: { offer: { id: string } }) =>
      app.dataSource
        .getRepository(Offer)
        .update({ id: Number(offer.id) }, { confirmedAt: new Date(Date.now() - 91 * DAY_MS) });
    const withStale = async (part: Record<string, unknown> = {}) => makeStale(await offered({}, part));

    it('name what is stale and what ends soon, to those in purchasing', async () => {
      await withStale({ partNumber: 'P-STALE' });
      const validUntil = addDays(dayOf(new Date()), 9);
      await offered({ validUntil }, { partNumber: 'P-SOON' });
      await offered({}, { partNumber: 'P-FRESH' });
      await look();
      const [mail, ...others] = await mails();
      expect(others).toEqual([]);
      expect(mail).toMatchObject({
        kind: 'price-digest',
        to: buyer.email,
        teamId: team.id,
        subject: 'Prices of Weir & Sons: 1 stale, 1 ending soon',
      });
      expect(mail.text).toContain('/prices?state=stale,expiring');
      expect(mail.html).toContain('P-STALE');
      const [soon, stale, ...more] = await told();
      expect(soon).toMatch(
        new RegExp(
          `^P-SOON by Kestrel Analog, from Supplier \\d+ at 4.20 EUR for 1 or more, ends on ${dayText(new Date(validUntil))}$`,
        ),
      );
      expect(stale).toMatch(/^P-STALE by .* last confirmed on \d\d? \w+ \d{4}$/);
      expect(more).toEqual([]);
    });

    it('go out once a week, though two processes look at once and the lock is passed over', async () => {
      await withStale();
      await Promise.all([look(), look(later(0.001))]);
      await Promise.all([later(1), later(5.7)].map((now) => app.nest.get(PriceDigests).send(now)));
      expect(await recipients()).toEqual([buyer.email]);
      await Promise.all([1, 2, 3].map(() => app.nest.get(PriceDigests).send(later(6))));
      expect(await recipients()).toEqual([buyer.email, buyer.email]);
      const weeks = await app.dataSource.getRepository(PriceDigest).findBy({ teamId: team.id });
      expect(weeks.map(({ week }) => week).sort()).toEqual(['2026-11-30', '2026-12-07']);
    });

    it('stay in the week’s mark only where their message does', async () => {
      await withStale();
      const broken = jest.spyOn(app.dataSource.manager.constructor.prototype, 'existsBy');
      broken.mockRejectedValueOnce(new Error('the outbox fails'));
      await look();
      broken.mockRestore();
      expect([
        await recipients(),
        await app.dataSource.getRepository(PriceDigest).countBy({ teamId: team.id }),
      ]).toEqual([[], 0]);
      await look();
      expect(await recipients()).toEqual([buyer.email]);
    });

    it('go to the admins where nobody is in purchasing', async () => {
      await withStale();
      await app.dataSource.getRepository(Membership).delete({ userId: buyer.caller.userId });
      await look();
      expect(await recipients()).toEqual([librarian.email]);
    });

    it('are none where nothing calls for a look, until the next week', async () => {
      const fresh = await offered();
      await look();
      await makeStale(fresh);
      await look(later(2));
      expect(await recipients()).toEqual([]);
      await look(later(7));
      expect(await recipients()).toEqual([buyer.email]);
    });

    it('are none for who refuses them, and none for a team that can’t keep prices', async () => {
      await withStale();
      await refuse(buyer, 'price-digest');
      await look();
      await app.dataSource.query('DELETE FROM refused_mails');
      for (const [week, status] of [
        [1, 'cancelled'],
        [2, null],
      ] as const) {
        await setPlan({ status });
        await look(later(7 * week));
      }
      expect(await recipients()).toEqual([]);
    });
  });

  describe('of parts', () => {
    const choose = (partIds: string[], changes: Record<string, unknown> = {}, member = engineer) =>
      saveConditions(member, { partIds, quantity: 100, ...changes });
    const setPrice = async (id: string, version: number, unitPrice: string) => {
      const rows = [{ id, version, breaks: [{ minimumQuantity: 1, unitPrice }] }];
      const { body } = await buyer.agent.put('/api/prices').send({ rows }).expect(200);
      return body.items[0] as { id: string; version: number };
    };
    const setLifecycle = (id: string, version: number, lifecycle: string) =>
      librarian.agent.patch(`/api/op-amps/${id}`).send({ version, lifecycle }).expect(200);

    it('say that a part became obsolete, once, to who saved the conditions and to nobody else', async () => {
      const stranger = await signInMember(app, await createTeam(app), ['admin', 'engineer']);
      await signInMember(app, team, ['engineer']);
      const part = await createOpAmp(librarian);
      await choose([part.id]);
      await saveConditions(stranger, { partIds: [(await createOpAmp(stranger)).id] });
      await setLifecycle(part.id, 1, 'obsolete');
      await Promise.all([look(), look()]);
      await look(later(1));
      expect(await mails()).toMatchObject([
        {
          kind: 'part-notice',
          to: engineer.email,
          teamId: team.id,
          subject: `${part.partNumber} by Kestrel Analog is now obsolete`,
          text: expect.stringContaining(`/parts/${part.id}`),
        },
      ]);
      expect(await told()).toEqual([
        `${part.partNumber} by Kestrel Analog (in River geophone): now obsolete.`,
      ]);
      await setLifecycle(part.id, 2, 'active');
      await look();
      await setLifecycle(part.id, 3, 'obsolete');
      await look();
      expect(await told()).toHaveLength(1);
    });

    it('gather all parts and conditions in one message, changed by hand, in bulk or by a list', async () => {
      const parts = [
        await createOpAmp(librarian),
        await createOpAmp(librarian),
        await createOpAmp(librarian),
      ];
      await choose(parts.map(({ id }) => id));
      await choose([parts[0].id], { name: 'Weir' });
      const bulk = parts.slice(0, 2).map(({ id }) => ({ id, version: 1, lifecycle: 'obsolete' }));
      await librarian.agent.patch('/api/op-amps').send({ parts: bulk }).expect(200);
      const row = `Kestrel Analog,${parts[2].partNumber},obsolete,1.1`;
      const { state } = await applyList(librarian, 'op-amps', `maker,mpn,lifecycle,en (nV/√Hz)\n${row}\n`);
      expect(state).toBe('applied');
      await look();
      expect((await mails()).map(({ subject }) => subject)).toEqual([
        '3 parts in your saved conditions have changed',
      ]);
      expect(await told()).toHaveLength(4);
    });

    it('say that a part is over a tenth dearer at the quantity, small steps together', async () => {
      const { partId, offer } = await offered({ breaks: [{ minimumQuantity: 1, unitPrice: '1.23' }] });
      await choose([partId]);
      await look();
      let { id, version } = await setPrice(offer.id, 1, '1.30');
      await look();
      expect(await told()).toEqual([]);
      ({ id, version } = await setPrice(id, version, '1.38'));
      await look();
      await look();
      expect(await told()).toEqual([expect.stringMatching(/12\u00a0% dearer at 100: 1\.23 → 1\.38 EUR\.$/)]);
      expect(await app.dataSource.getRepository(PartWatch).findBy({ partId: Number(partId) })).toMatchObject([
        { lifecycle: 'active', available: true, quantity: 100, unitPrice: '1.3800', currency: 'EUR' },
      ]);
      ({ id, version } = await setPrice(id, version, '1.00'));
      await look();
      await setPrice(id, version, '1.40');
      await look();
      expect(await told()).toEqual([]);
    });

    it('compare with what the part was when it was chosen, not with what the first look finds', async () => {
      const { partId, offer } = await offered({ breaks: [{ minimumQuantity: 1, unitPrice: '2' }] });
      const { id, version } = await choose([partId]);
      await setPrice(offer.id, 1, '3');
      await engineer.agent
        .patch(`/api/conditions/${id}`)
        .send({ version, partIds: [partId] })
        .expect(200);
      await look();
      expect(await told()).toEqual([expect.stringContaining('50\u00a0% dearer at 100: 2.00 → 3.00 EUR')]);
    });

    it('say that a part can’t be bought any more: out of stock, or without an offer', async () => {
      const sold = await offered();
      const closed = await offered();
      await choose([sold.partId, closed.partId]);
      await buyer.agent.patch(`/api/offers/${sold.offer.id}`).send({ version: 1, stock: 0 }).expect(200);
      await look();
      expect(await told()).toEqual([expect.stringMatching(/: no longer available: /)]);
      await buyer.agent.delete(`/api/offers/${closed.offer.id}?version=1`).expect(204);
      await look();
      await look();
      expect(await told()).toEqual([expect.stringMatching(/: no longer available: /)]);
    });

    it('forget what is no longer chosen', async () => {
      const part = await createOpAmp(librarian);
      const { id, version } = await choose([part.id]);
      await engineer.agent.patch(`/api/conditions/${id}`).send({ version, partIds: [] }).expect(200);
      await setLifecycle(part.id, 1, 'obsolete');
      await look();
      expect(await recipients()).toEqual([]);
      expect(await app.dataSource.getRepository(PartWatch).countBy({ partId: Number(part.id) })).toBe(0);
    });

    it('are none for who refuses them or has left', async () => {
      const part = await createOpAmp(librarian);
      await choose([part.id]);
      const other = await signInMember(app, team, ['engineer']);
      await choose([part.id], { name: 'Weir' }, other);
      await refuse(engineer, 'part-notice');
      await app.dataSource.getRepository(Membership).delete({ userId: other.caller.userId });
      await setLifecycle(part.id, 1, 'obsolete');
      await look();
      expect(await recipients()).toEqual([]);
    });

    it('wait while the team’s plan is read-only', async () => {
      const part = await createOpAmp(librarian);
      await choose([part.id]);
      await setLifecycle(part.id, 1, 'obsolete');
      await setPlan({ status: 'cancelled' });
      await look();
      expect(await recipients()).toEqual([]);
      await setPlan({ status: 'active' });
      await look();
      expect(await recipients()).toEqual([engineer.email]);
    });

    it('reach the mail server, with the way to stop them', async () => {
      const server = new MailServer();
      await server.start();
      const smtp = { SMTP_HOST: '127.0.0.1', SMTP_PORT: String(server.port) };
      const sender = new MailSender(app.dataSource, testConfig(smtp), app.nest.get(UnsubscribeLinks));
      const part = await createOpAmp(librarian);
      await choose([part.id]);
      await setLifecycle(part.id, 1, 'obsolete');
      await look();
      await sender.sendDue();
      await server.stop();
      expect(server.headers('To')).toEqual([engineer.email]);
      expect(server.headers('Subject')).toEqual([`${part.partNumber} by Kestrel Analog is now obsolete`]);
      expect(server.headers('List-Unsubscribe')[0]).toMatch(/\/api\/mail\/unsubscribe\/\d+\.part-notice\./);
    });
  });
});
