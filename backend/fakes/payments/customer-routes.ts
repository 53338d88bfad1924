import { invalid } from './api-error.js';
import { metadata, oneOf, flag, list, required, shape, text, integer } from './params.js';
import { listRoute, listShape, post, retrieve, type Route } from './route.js';
import { findIn, newId, PRICE, type State } from './state.js';

const customer = shape({ name: text, email: text, metadata });

export const CUSTOMER_ROUTES: Route[] = [
  post('/v1/customers', customer, (state, { name = null, email = null, metadata = {} }) => {
    const id = newId('cus');
    return (state.data.customers[id] = {
      id,
      object: 'customer',
      created: state.now,
      livemode: false,
      name,
      email,
      balance: 0,
      metadata,
    });
  }),
  retrieve('/v1/customers/:id', 'customer', ({ data }) => data.customers),
  listRoute(
    '/v1/prices',
    shape({ ...listShape, lookup_keys: list(text, 10), active: flag, type: oneOf('recurring', 'one_time') }),
    (_, { lookup_keys: keys, active = true, type = 'recurring' }) =>
      [PRICE].filter(
        (price) =>
          price.active === active && price.type === type && (keys?.includes(price.lookup_key) ?? true),
      ),
  ),
  post(
    '/v1/billing_portal/sessions',
    shape({ customer: required(text), return_url: text }),
    (state, { customer, return_url = null }) => {
      findIn(state.data.customers, customer, 'customer');
      const id = newId('bps');
      return (state.data.portals[id] = {
        id,
        object: 'billing_portal.session',
        created: state.now,
        livemode: false,
        customer,
        return_url,
        url: `/portal/${id}`,
      });
    },
  ),
];

const lineItem = shape({ price: required(text), quantity: required(integer(1, 999_999)) });

const checkout = shape({
  mode: required(oneOf('subscription')),
  customer: required(text),
  client_reference_id: text,
  line_items: required(list(lineItem, 1)),
  success_url: required(text),
  cancel_url: text,
  metadata,
  subscription_data: shape({ metadata }),
});

export const CHECKOUT_ROUTES: Route[] = [
  post('/v1/checkout/sessions', checkout, (state, params) => {
    findIn(state.data.customers, params.customer, 'customer');
    const [line] = params.line_items;
    if (line?.price !== PRICE.id)
      throw invalid(`No such price: '${line?.price}'`, { code: 'resource_missing' });
    const id = newId('cs');
    state.data.carts[id] = {
      quantity: line.quantity,
      metadata: params.subscription_data?.metadata ?? {},
    };
    return (state.data.sessions[id] = {
      id,
      object: 'checkout.session',
      created: state.now,
      livemode: false,
      mode: params.mode,
      status: 'open',
      payment_status: 'unpaid',
      customer: params.customer,
      client_reference_id: params.client_reference_id ?? null,
      subscription: null,
      url: `/pay/${id}`,
      success_url: params.success_url,
      cancel_url: params.cancel_url ?? null,
      metadata: params.metadata ?? {},
    });
  }),
  listRoute(
    '/v1/checkout/sessions',
    shape({ ...listShape, customer: text, status: oneOf('open', 'complete', 'expired') }),
    ({ data }, { customer, status }) =>
      Object.values(data.sessions).filter(
        (session) =>
          session.customer === (customer ?? session.customer) &&
          session.status === (status ?? session.status),
      ),
  ),
  retrieve('/v1/checkout/sessions/:id', 'checkout.session', ({ data }) => data.sessions),
  post('/v1/checkout/sessions/:id/expire', shape({}), (state, _, id) => {
    const session = findIn(state.data.sessions, id, 'checkout.session');
    if (session.status !== 'open')
      throw invalid('Only Checkout Sessions with a status in ["open"] can be expired.');
    session.status = 'expired';
    session.url = null;
    state.emit('checkout.session.expired', session);
    return session;
  }),
];

/** Whether the session can still be paid. */
export function assertOpen(state: State, id: string) {
  const session = findIn(state.data.sessions, id, 'checkout.session');
  if (session.status !== 'open') throw invalid('This Checkout Session is no longer open.');
  return session;
}
