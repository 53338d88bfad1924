import { readConfig } from './read-config.js';

const production = {
  NODE_ENV: 'production',
  JWT_SECRET: 'a-secret-of-more-than-thirty-two-letters',
  DB_PASSWORD: 'not-empty',
  PUBLIC_ORIGIN: 'https://noise.example.org',
  SMTP_HOST: 'mail.example.org',
  MAIL_FROM: 'Roothertz <noise@example.org>',
};

describe('readConfig', () => {
  it('works on a developer’s machine with nothing set', () => {
    expect(readConfig({})).toMatchObject({ HOST: '127.0.0.1', PORT: 3000, DB_NAME: 'roothertz' });
  });

  it('takes an empty variable for one that is left out', () => {
    const config = readConfig({ PORT: '', PUBLIC_ORIGIN: '' });
    expect([config.PORT, config.PUBLIC_ORIGIN]).toEqual([3000, undefined]);
  });

  it('reads numbers from text and cuts the public address down to its origin', () => {
    const config = readConfig({ PORT: '8080', PUBLIC_ORIGIN: 'https://noise.example.org/' });
    expect(config).toMatchObject({ PORT: 8080, PUBLIC_ORIGIN: 'https://noise.example.org' });
  });

  it('starts in production with secrets, an address and a mail server', () => {
    expect(readConfig(production).isProduction).toBe(true);
  });

  it.each(['JWT_SECRET', 'DB_PASSWORD', 'PUBLIC_ORIGIN', 'SMTP_HOST', 'MAIL_FROM'] as const)(
    'refuses production without %s',
    (name) => {
      expect(() => readConfig({ ...production, [name]: undefined })).toThrow(name);
    },
  );

  it('signs sessions with another secret at every start where none is given', () => {
    expect(readConfig({}).JWT_SECRET).not.toBe(readConfig({}).JWT_SECRET);
  });

  it.each([
    ['PORT', '70000'],
    ['PORT', 'http'],
    ['DB_PORT', '0'],
    ['DB_NAME', 'a`b'],
    ['NODE_ENV', 'staging'],
    ['PUBLIC_ORIGIN', 'noise.example.org'],
    ['TRUST_PROXY', 'everyone'],
    ['JWT_SECRET', 'short'],
    ['SMTP_PORT', '99999'],
    ['SMTP_SECURE', 'perhaps'],
    ['MAIL_FROM', 'nobody'],
    ['STRIPE_PORT', '99999'],
    ['STRIPE_PROTOCOL', 'gopher'],
  ])('names %s and hides its value %s when it is wrong', (name, value) => {
    const message = messageOf(() => readConfig({ [name]: value }));
    expect(message).toContain(name);
    expect(message).not.toContain(value);
  });

  it.each([
    ['STRIPE_HOST', '127.0.0.1'],
    ['STRIPE_HOST', 'localhost'],
    ['STRIPE_PROTOCOL', 'http'],
    ['STRIPE_SECRET_KEY', 'sk_fake_7f3a'],
    ['STRIPE_WEBHOOK_SECRET', 'whsec_fake_7f3a'],
  ])('takes %s = %s of a stand-in of the payment service anywhere but in production', (name, value) => {
    const keys = { STRIPE_SECRET_KEY: 'sk_live_x', STRIPE_WEBHOOK_SECRET: 'whsec_x' };
    expect(readConfig({ ...keys, [name]: value })).toHaveProperty(name, value);
    expect(readConfig({ ...production, ...keys })).toMatchObject({ ...keys, STRIPE_HOST: 'api.stripe.com' });
    expect(() => readConfig({ ...production, ...keys, [name]: value })).toThrow(name);
  });

  it('refuses a key of the payment service without the secret of its events', () => {
    expect(() => readConfig({ STRIPE_SECRET_KEY: 'sk_test_x' })).toThrow('STRIPE_WEBHOOK_SECRET');
  });

  it('names everything that is wrong at once', () => {
    const message = messageOf(() => readConfig({ PORT: 'x', DB_PORT: 'y' }));
    expect(message).toMatch(/PORT.*DB_PORT/);
  });
});

function messageOf(read: () => unknown): string {
  try {
    read();
    return '';
  } catch (error) {
    return (error as Error).message;
  }
}
