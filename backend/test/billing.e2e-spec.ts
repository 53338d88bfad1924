import { In, Like } from 'typeorm';
import type { PaymentsFake } from '../fakes/payments/payments-fake.js';
import { AuditEntry } from '../src/audit/entities/audit-entry.entity.js';
import { BillingEvent } from '../src/billing/entities/billing-event.entity.js';
import { OutboxMail } from '../src/mail/entities/outbox-mail.entity.js';
import { Subscription } from '../src/plans/entities/subscription.entity.js';
import { createOpAmp, opAmpBody } from './factories/op-amps.js';
import {
  createTeam,
  daysAgo,
  press,
  signed,
  signInMember,
  startPaidApp,
  type TestApp,
  type TestMember,
} from './support/index.js';

describe('paying for a plan', () => {
  let app: TestApp;
  let payments: PaymentsFake;
  let admin: TestMember;

  beforeAll(async () => {
    ({ app, payments } = await startPaidApp());
  });
  beforeEach(async () => {
    daysAgo(payments, 0);
    Object.assign(payments.switches, { duplicate: false, reverse: false, failNext: 0 });
    payments.deliverTo(`${await app.nest.getUrl()}/api/billing/webhook`);
    admin = await signInMember(app, await createTeam(app, { plan: 'free' }), ['admin']);
  });
  afterAll(async () => {
    await payments.close();
    await app.close();
  });

  const send = (path: string, body: object = {}, status = 201) =>
    admin.agent.post(`/api/billing/${path}`).send(body).expect(status);
  const billing = async () => (await admin.agent.get('/api/billing').expect(200)).body;
  const kept = (member = admin) =>
    app.dataSource.getRepository(Subscription).findOneByOrFail({ teamId: member.caller.teamId });
  const trail = async () =>
    (
      await app.dataSource
        .getRepository(AuditEntry)
        .find({ where: { teamId: admin.caller.teamId }, order: { id: 'ASC' } })
    ).map(({ action, userId, to }) => ({ action, userId, to }));
  const payPage = async (seats: number): Promise<string> => (await send('checkout', { seats })).body.url;
  const portal = async (): Promise<string> => (await send('portal')).body.url;

  async function buy(seats = 3, card = 'pays'): Promise<void> {
    await press(await payPage(seats), { card });
    await payments.settled();
  }

  describe('with a trial', () => {
    it('starts once, without a card, however often it is asked for', async () => {
      const answers = await Promise.all([1, 2, 3].map(() => admin.agent.post('/api/billing/trial')));
      expect(answers.map(({ status }) => status).sort()).toEqual([201, 409, 409]);
      expect(answers.find(({ status }) => status === 409)?.body.code).toBe('billing.trial-used');
      expect(await billing()).toMatchObject({ plan: 'team', standing: 'trial', seats: 5, mayTry: false });
      const { trialEndsAt } = await kept();
      const days = (Number(trialEndsAt) - Date.now()) / 86_400_000;
      expect(days).toBeGreaterThan(13.99);
      expect(days).toBeLessThanOrEqual(14);
      expect(await trail()).toMatchObject([{ action: 'plan.trial-started', userId: admin.caller.userId }]);
      await createOpAmp(admin);
    });

    it('isn’t for a team that has had a plan', async () => {
      await buy();
      await send('trial', {}, 409);
    });
  });

  describe('through the service’s page', () => {
    it('gives the team its plan when the service tells that it is paid', async () => {
      await admin.agent.post('/api/op-amps').send(opAmpBody()).expect(402);
      const url = await payPage(3);
      const back = await press(url, { card: 'pays' });
      expect(back).toBe(`${await app.nest.getUrl()}/team/plan?from=checkout`);
      await payments.settled();
      expect(await kept()).toMatchObject({ status: 'active', seats: 3, endsAt: null, pastDueSince: null });
      expect(await billing()).toMatchObject({
        plan: 'team',
        standing: 'active',
        seats: 3,
        usedSeats: 1,
        periodEndsAt: (await kept()).currentPeriodEnd?.toISOString(),
        payment: {
          seatPrice: { amount: '19.00', currency: 'EUR' },
          next: { amount: '57.00', currency: 'EUR', at: (await kept()).currentPeriodEnd?.toISOString() },
          invoices: [{ status: 'paid', amount: '57.00', url: expect.stringContaining('/invoice/') }],
        },
      });
      await createOpAmp(admin);
      expect(await trail()).toContainEqual({
        action: 'plan.changed',
        userId: null,
        to: expect.objectContaining({ status: 'active', seats: 3 }),
      });
    });

    it('gives nothing for the redirect alone, and the plan on the way back when the events are late', async () => {
      payments.deliverTo('http://127.0.0.1:1/');
      await press(await payPage(2), { card: 'pays' });
      expect((await billing()).plan).toBe('free');
      expect((await send('sync', {}, 200)).body).toMatchObject({
        plan: 'team',
        standing: 'active',
        seats: 2,
      });
    });

    it('gives nothing where the card is declined', async () => {
      await buy(2, 'declined');
      expect((await send('sync', {}, 200)).body).toMatchObject({ plan: 'free', payment: { invoices: [] } });
      expect(await kept()).toMatchObject({ status: null, seats: 0 });
    });

    it('can be paid once: an older page is closed, and a team with a plan gets no other', async () => {
      const [older, newer] = [await payPage(2), await payPage(4)];
      expect(await press(older, { card: 'pays' })).toBe(null);
      await press(newer, { card: 'pays' });
      await payments.settled();
      expect(await kept()).toMatchObject({ status: 'active', seats: 4 });
      expect((await send('checkout', { seats: 2 }, 409)).body.code).toBe('billing.subscribed');
    });

    it('sells no fewer seats than are taken, and whole ones only', async () => {
      await signInMember(app, { id: admin.caller.teamId, plan: 'free' }, ['engineer']);
      const { body } = await send('checkout', { seats: 1 }, 422);
      expect(body).toMatchObject({ code: 'billing.seats', errors: [{ field: 'seats' }] });
      for (const seats of [0, 1.5, 501, '3', null]) await send('checkout', { seats }, 400);
    });

    it('is closed to everybody but admins', async () => {
      const member = await signInMember(app, { id: admin.caller.teamId, plan: 'free' }, [
        'librarian',
        'purchasing',
      ]);
      await member.agent.get('/api/billing').expect(403);
      for (const path of ['trial', 'checkout', 'portal', 'sync', 'seats/preview'])
        await member.agent.post(`/api/billing/${path}`).send({ seats: 2 }).expect(403);
    });

    it('says that the service doesn’t answer, and shows what is known all the same', async () => {
      await buy();
      payments.switches.failNext = 20;
      expect(await billing()).toMatchObject({ plan: 'team', seats: 3, payment: null });
      payments.switches.failNext = 20;
      expect((await send('portal', {}, 503)).body.code).toBe('billing.unavailable');
      payments.switches.failNext = 1;
      await send('portal');
    });
  });

  describe('by events', () => {
    it('is changed once by events that come twice, in reverse, late and again', async () => {
      Object.assign(payments.switches, { duplicate: true, reverse: true });
      await buy();
      const [before, told] = [await kept(), await trail()];
      const ids = payments.state.data.events
        .filter(({ data }) => 'customer' in data.object && data.object.customer === before.customerId)
        .map(({ id }) => id);
      const taken = () => app.dataSource.getRepository(BillingEvent).countBy({ id: In(ids) });
      expect([ids.length, await taken()]).toEqual([3, 3]);
      expect(told).toHaveLength(1);
      await payments.resend();
      expect([await kept(), await trail()]).toEqual([before, told]);
      expect(await taken()).toBe(3);
    });

    it('isn’t brought back by an old event that arrives for the first time after its end', async () => {
      payments.deliverTo('http://127.0.0.1:1/');
      await press(await payPage(2), { card: 'pays' });
      await press(`${await portal()}/end`);
      await send('sync', {}, 200);
      expect((await billing()).standing).toBe('cancelled');
      payments.deliverTo(`${await app.nest.getUrl()}/api/billing/webhook`);
      await payments.resend('customer.subscription.created');
      expect((await kept()).status).toBe('cancelled');
    });

    it('keeps nothing of an event whose effect fails, and takes it when it comes again', async () => {
      payments.deliverTo('http://127.0.0.1:1/');
      await press(await payPage(2), { card: 'pays' });
      const { id, type } = payments.state.data.events.at(-1)!;
      const body = JSON.stringify(payments.state.data.events.at(-1));
      const post = () =>
        app.request.post('/api/billing/webhook').set('Stripe-Signature', signed(body)).send(body);
      payments.switches.failNext = 5;
      await post().expect(503);
      expect(await app.dataSource.getRepository(BillingEvent).existsBy({ id })).toBe(false);
      payments.switches.failNext = 0;
      await post().set('Origin', 'https://elsewhere.example').expect(204);
      expect(await app.dataSource.getRepository(BillingEvent).findOneBy({ id })).toMatchObject({ type });
      expect((await kept()).status).toBe('active');
    });

    const eventOf = (customer: string, more: object = {}) =>
      JSON.stringify({
        id: `evt_${customer}_${Math.random()}`,
        object: 'event',
        type: 'checkout.session.completed',
        data: { object: { object: 'checkout.session', customer, ...more } },
      });
    const deliver = (body: string, signature?: string) =>
      app.request
        .post('/api/billing/webhook')
        .set('Content-Type', 'application/json')
        .set(signature === undefined ? {} : { 'Stripe-Signature': signature })
        .send(body);

    it('refuses what isn’t signed, signed by another or signed long ago', async () => {
      const body = eventOf('cus_x');
      const now = Math.floor(Date.now() / 1000);
      for (const signature of [
        undefined,
        '',
        'garbled',
        signed(body, now, 'whsec_another'),
        signed(body, now - 3600),
        signed(`${body} `),
      ])
        expect((await deliver(body, signature).expect(400)).body.code).toBe('billing.event');
      expect((await deliver('', signed(''))).status).toBe(400);
      expect((await deliver('{"id":', signed('{"id":'))).status).toBe(400);
    });

    it('takes events up to a megabyte and lets those of unknown customers and kinds pass', async () => {
      const large = eventOf('cus_unknown', { metadata: { note: 'x'.repeat(900_000) } });
      await deliver(large, signed(large)).expect(204);
      const huge = eventOf('cus_unknown', { metadata: { note: 'x'.repeat(1_100_000) } });
      await deliver(huge, signed(huge)).expect(413);
      const other = eventOf('cus_unknown').replace('checkout.session.completed', 'charge.refunded');
      await deliver(other, signed(other)).expect(204);
      const unknown = { id: Like('evt_cus_unknown%') };
      expect(await app.dataSource.getRepository(BillingEvent).existsBy(unknown)).toBe(false);
    });

    it('changes nothing for a team that an event of another team’s customer names', async () => {
      await buy(4);
      const paying = admin;
      const { customerId } = await kept();
      admin = await signInMember(app, await createTeam(app, { plan: 'free' }), ['admin']);
      const body = eventOf(String(customerId), {
        client_reference_id: String(admin.caller.teamId),
        metadata: { team: String(admin.caller.teamId) },
      });
      await deliver(body, signed(body)).expect(204);
      expect((await billing()).plan).toBe('free');
      expect(await kept(paying)).toMatchObject({ status: 'active', seats: 4 });
    });
  });

  describe('when a payment fails', () => {
    it('works on for fourteen days, then is read-only until it is paid', async () => {
      daysAgo(payments, 36);
      await buy(3, 'later');
      const part = await createOpAmp(admin);
      await payments.letDaysPass(31);
      expect(await billing()).toMatchObject({ plan: 'team', standing: 'past-due', seats: 3 });
      await createOpAmp(admin);
      await payments.resend('invoice.payment_failed');
      const mails = await app.dataSource.getRepository(OutboxMail).findBy({ teamId: admin.caller.teamId });
      expect(mails).toMatchObject([{ kind: 'payment-failed', to: admin.email }]);
      expect(mails[0].text).toMatch(/Everything works until \d{4}-/);

      daysAgo(payments, 50);
      admin = await signInMember(app, await createTeam(app, { plan: 'free' }), ['admin']);
      await buy(3, 'later');
      const { id } = await createOpAmp(admin);
      await payments.letDaysPass(31);
      expect(await billing()).toMatchObject({ plan: 'team', standing: 'unpaid' });
      const { body } = await admin.agent.post('/api/op-amps').send(opAmpBody()).expect(402);
      expect(body.code).toBe('access.read-only');
      await admin.agent.get(`/api/op-amps/${id}`).expect(200);
      await admin.agent.get('/api/op-amps.csv').expect(200);
      expect(part.id).not.toBe(id);

      await press(`${await portal()}/card`, { card: 'pays' });
      await payments.settled();
      expect(await billing()).toMatchObject({ standing: 'active' });
      expect((await kept()).pastDueSince).toBe(null);
      await createOpAmp(admin);
    });
  });

  describe('when it is cancelled', () => {
    it('runs to the end of what is paid, is read-only then, and can be bought again', async () => {
      daysAgo(payments, 40);
      await buy(2);
      await press(`${await portal()}/cancel`);
      await payments.settled();
      const { endsAt, standing } = await billing();
      expect(standing).toBe('active');
      expect(endsAt).toBe((await kept()).currentPeriodEnd?.toISOString());
      const { id } = await createOpAmp(admin);
      await payments.letDaysPass(32);
      expect(await billing()).toMatchObject({ standing: 'cancelled', seats: 0, payment: { next: null } });
      await admin.agent.post('/api/op-amps').send(opAmpBody()).expect(402);
      await admin.agent.get(`/api/op-amps/${id}`).expect(200);
      await buy(2);
      expect(await billing()).toMatchObject({ standing: 'active', seats: 2, endsAt: null });
      await createOpAmp(admin);
    });
  });

  describe('for a team whose only member goes', () => {
    const obstacle = async () =>
      (await admin.agent.get('/api/account/closing').expect(200)).body.items[0].obstacle;

    it('is ended first, and needn’t have run out', async () => {
      expect(await obstacle()).toBe(null);
      await buy(1);
      expect(await obstacle()).toContain('end it under Plan first');
      await press(`${await portal()}/cancel`);
      await payments.settled();
      expect(await obstacle()).toBe(null);
    });
  });

  describe('by seats', () => {
    const preview = (seats: number, status = 200) => send('seats/preview', { seats }, status);
    const change = (seats: number, prorationDate: number) =>
      admin.agent.put('/api/billing/seats').send({ seats, prorationDate });

    it('says what more seats cost, and charges that', async () => {
      await buy(2);
      const { body } = await preview(5);
      expect(body).toMatchObject({ seats: 5, monthly: { amount: '95.00', currency: 'EUR' } });
      expect(Number(body.dueNow.amount)).toBeGreaterThan(50);
      const after = (await change(5, body.prorationDate).expect(200)).body;
      expect(after).toMatchObject({ seats: 5, payment: { next: { amount: '95.00' } } });
      expect(after.payment.invoices[0]).toMatchObject({ amount: body.dueNow.amount, status: 'paid' });
      expect((await trail()).at(-1)).toMatchObject({ userId: admin.caller.userId, to: { seats: 5 } });
    });

    it('credits seats that are removed, and removes none that is taken', async () => {
      await buy(3);
      const { body } = await preview(1);
      expect(Number(body.dueNow.amount)).toBeLessThan(-30);
      await signInMember(app, { id: admin.caller.teamId, plan: 'team' }, ['engineer']);
      const refused = (await change(1, body.prorationDate).expect(422)).body;
      expect(refused).toMatchObject({
        code: 'billing.seats',
        errors: [{ field: 'seats', message: 'seats: 2 are taken: remove members or invitations first' }],
      });
      await preview(1, 422);
      expect((await kept()).seats).toBe(3);
      expect((await change(2, (await preview(2)).body.prorationDate).expect(200)).body.seats).toBe(2);
    });

    it('changes nothing where the card is declined or the preview is old', async () => {
      await buy(2, 'later');
      const { prorationDate } = (await preview(4)).body;
      expect((await change(4, prorationDate).expect(402)).body.code).toBe('billing.declined');
      for (const date of [prorationDate - 3600, prorationDate + 3600])
        expect((await change(4, date).expect(409)).body.code).toBe('billing.outdated');
      expect((await kept()).seats).toBe(2);
      expect((await send('sync', {}, 200)).body.seats).toBe(2);
    });

    it('has none to change without a paid plan', async () => {
      expect((await preview(4, 409)).body.code).toBe('billing.not-subscribed');
      expect((await change(4, 0).expect(409)).body.code).toBe('billing.not-subscribed');
    });
  });
});
