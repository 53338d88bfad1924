import { DAY } from './calendar.js';
import { type Data, State } from './state.js';
import { startSubscription } from './subscriptions.js';

const STARTED_DAYS_AGO = 10;

interface Demo {
  team: { name: string };
  subscription: { seats: number; customerId: string; subscriptionId: string };
}

/** What a new stand-in begins with: the demo team has paid for its seats ten days ago. */
export function demoData({ team, subscription: { seats, customerId, subscriptionId } }: Demo): Data {
  const state = new State();
  const at = state.now - STARTED_DAYS_AGO * DAY;
  state.data.customers[customerId] = {
    id: customerId,
    object: 'customer',
    created: at,
    livemode: false,
    name: team.name,
    email: null,
    balance: 0,
    metadata: {},
  };
  state.data.cards[customerId] = 'pays';
  startSubscription(state, {
    customer: customerId,
    quantity: seats,
    metadata: {},
    at,
    id: subscriptionId,
  });
  return state.data;
}
