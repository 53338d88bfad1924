import { randomBytes } from 'node:crypto';
import { plainToInstance } from 'class-transformer';
import { validateSync } from 'class-validator';
import { AppConfig } from './app-config.js';

const NAMES = [
  'NODE_ENV',
  'HOST',
  'PORT',
  'PUBLIC_ORIGIN',
  'TRUST_PROXY',
  'DB_HOST',
  'DB_PORT',
  'DB_USER',
  'DB_PASSWORD',
  'DB_OWNER_USER',
  'DB_OWNER_PASSWORD',
  'DB_NAME',
  'JWT_SECRET',
  'FRONTEND_DIST',
  'IMPORT_DIR',
  'SMTP_HOST',
  'SMTP_PORT',
  'SMTP_USER',
  'SMTP_PASSWORD',
  'SMTP_SECURE',
  'MAIL_FROM',
  'STRIPE_SECRET_KEY',
  'STRIPE_WEBHOOK_SECRET',
  'STRIPE_HOST',
  'STRIPE_PORT',
  'STRIPE_PROTOCOL',
  'STRIPE_PRICE_LOOKUP_KEY',
] as const satisfies readonly (keyof AppConfig)[];

/**
 * The configuration that the environment gives. An empty variable counts as left out.
 * @throws an error that names every variable that is wrong, and never a value
 */
export function readConfig(environment: NodeJS.ProcessEnv = process.env): AppConfig {
  const given = NAMES.filter((name) => environment[name]).map((name) => [name, environment[name]]);
  const config = plainToInstance(AppConfig, Object.fromEntries(given));
  if (!config.isProduction) {
    config.JWT_SECRET ??= randomBytes(32).toString('base64url');
    config.MAIL_FROM ??= 'Roothertz <no-reply@roothertz.example>';
  }
  const wrong = validateSync(config).map(({ property, constraints }) => {
    return `${property} (${Object.values(constraints ?? {})
      .map(withoutValue)
      .join(', ')})`;
  });
  if (wrong.length > 0) throw new Error(`The environment can’t be used: ${wrong.join('; ')}.`);
  return config;
}

function withoutValue(message: string): string {
  return message.replace(/^\w+ /, '');
}
