import { Injectable, Logger } from '@nestjs/common';
import Stripe from 'stripe';
import { AppConfig } from '../config/app-config.js';
import { DomainError } from '../shared/errors/domain-error.js';

const TIMEOUT_MS = 10_000;
const RETRY_AFTER_SECONDS = 5;

/** The payment service: the one place that makes its client and knows its errors. */
@Injectable()
export class Payments {
  private readonly logger = new Logger(Payments.name);
  private readonly client: Stripe | null;

  constructor(private readonly config: AppConfig) {
    this.client = createClient(config);
  }

  /** Asks the service; what goes wrong there comes out as an error of the application's own. */
  async ask<Answer extends object>(question: (service: Stripe) => Promise<Answer>): Promise<Answer> {
    if (this.client === null)
      throw new DomainError(
        'billing.unavailable',
        'Payment isn’t set up on this server: ask whoever runs it.',
      );
    try {
      return whole(await question(this.client));
    } catch (error) {
      throw this.toDomainError(error);
    }
  }

  /** The price of a seat for a month. */
  async price(): Promise<Stripe.Price> {
    const { data } = await this.ask((service) =>
      service.prices.list({ lookup_keys: [this.config.STRIPE_PRICE_LOOKUP_KEY], active: true, limit: 1 }),
    );
    if (data.length > 0) return data[0];
    this.logger.error(`No active price has the lookup key ${this.config.STRIPE_PRICE_LOOKUP_KEY}.`);
    throw unavailable();
  }

  /** The event in a body that the service has signed; anything else is refused. */
  readEvent(body: unknown, signature: string | undefined): Stripe.Event {
    const { STRIPE_WEBHOOK_SECRET: secret } = this.config;
    try {
      if (this.client === null || secret === undefined || !Buffer.isBuffer(body)) throw new Error();
      return this.client.webhooks.constructEvent(body, signature ?? '', secret);
    } catch {
      throw new DomainError(
        'billing.event',
        'This is no event that the payment service has signed just now.',
      );
    }
  }

  private toDomainError(error: unknown): unknown {
    if (!(error instanceof Stripe.errors.StripeError)) return error;
    if (error instanceof Stripe.errors.StripeCardError)
      return new DomainError(
        'billing.declined',
        'The card was declined, and nothing has changed: use another one under “Card and cancellation”.',
      );
    this.logger.error(
      `${error.type} ${error.code ?? ''} ${error.message} (${error.requestId ?? 'no answer'})`,
    );
    return unavailable();
  }
}

function createClient({ STRIPE_SECRET_KEY: key, ...config }: AppConfig): Stripe | null {
  if (key === undefined) return null;
  return new Stripe(key, {
    host: config.STRIPE_HOST,
    port: config.STRIPE_PORT,
    protocol: config.STRIPE_PROTOCOL,
    telemetry: false,
    timeout: TIMEOUT_MS,
    maxNetworkRetries: 1,
  });
}

/** The SDK takes any answer without an error object for a good one, such as a proxy's own. */
function whole<Answer extends object>(answer: Answer): Answer {
  if ('object' in answer && typeof answer.object === 'string') return answer;
  throw unavailable();
}

function unavailable(): DomainError {
  return new DomainError(
    'billing.unavailable',
    'The payment service doesn’t answer: try again in a moment.',
    {
      retryAfter: RETRY_AFTER_SECONDS,
    },
  );
}
