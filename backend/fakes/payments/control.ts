import express, { Router } from 'express';
import { DAY } from './calendar.js';
import type { Delivery } from './delivery.js';
import { day, form, page, paragraph, table } from './html.js';
import { flag, integer, shape, text } from './params.js';
import { advance } from './passing-time.js';
import { findIn, type State } from './state.js';
import type { Switches } from './switches.js';

/** Days that a button lets pass. */
const SPANS: readonly [number, string][] = [
  [1, 'a day'],
  [15, '15 days'],
  [31, '31 days'],
];

const clockForm = shape({ days: integer(0, 400) });
const switchForm = shape({ duplicate: flag, reverse: flag, failNext: integer(0, 100) });
const resendForm = shape({ event: text });

/** What the real service has no button for: its clock, its bad days, its events once more. */
export function controlRouter(state: State, switches: Switches, delivery: Delivery): Router {
  const router = Router();
  router.use(express.urlencoded({ extended: true }));
  router.get('/', (_, response) => {
    response.send(controlPage(state.now, switches, Object.keys(state.data.subscriptions).length));
  });
  router.post('/control/clock', (request, response) => {
    const { days = 0 } = clockForm(request.body ?? {}, '');
    advance(state, days * DAY);
    response.redirect(303, '/');
  });
  router.post('/control/switches', (request, response) => {
    const given = Object.entries(switchForm(request.body ?? {}, ''));
    Object.assign(switches, Object.fromEntries(given.filter(([, value]) => value !== undefined)));
    response.redirect(303, '/');
  });
  router.post('/control/resend', (request, response) => {
    const { event } = resendForm(request.body ?? {}, '');
    const byId = Object.fromEntries(state.data.events.map((one) => [one.id, one]));
    delivery.send(event === undefined ? state.data.events : [findIn(byId, event, 'event')]);
    response.redirect(303, '/');
  });
  return router;
}

function controlPage(now: number, { duplicate, reverse, failNext }: Switches, subscriptions: number): string {
  const toggle = (name: string, on: boolean) =>
    form('/control/switches', `Turn ${on ? 'off' : 'on'}`, hidden(name, String(!on)));
  return page(
    'What it does',
    paragraph(`It keeps ${subscriptions} subscriptions, and it is ${day(now)}.`),
    paragraph('When time passes here, what falls due happens, and all that it keeps is so much older.'),
    ...SPANS.map(([days, label]) =>
      form('/control/clock', `Let ${label} pass`, hidden('days', String(days))),
    ),
    table([
      ['every event twice', duplicate ? 'on' : 'off'],
      ['events in reverse', reverse ? 'on' : 'off'],
      ['requests that will fail', String(failNext)],
    ]),
    `<h2>Every event twice</h2>${toggle('duplicate', duplicate)}`,
    `<h2>Events in reverse</h2>${toggle('reverse', reverse)}`,
    `<h2>Failure</h2>${form('/control/switches', 'Fail the next two requests', hidden('failNext', '2'))}`,
    `<h2>Events</h2>${form('/control/resend', 'Send all of them again')}`,
  );
}

function hidden(name: string, value: string): string {
  return `<input type="hidden" name="${name}" value="${value}">`;
}
