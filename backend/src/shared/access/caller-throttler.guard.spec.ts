import type { ExecutionContext } from '@nestjs/common';
import { Reflector } from '@nestjs/core';
import { ThrottlerStorageService } from '@nestjs/throttler';
import { CallerThrottlerGuard } from './caller-throttler.guard.js';

class Routes {
  ask(): void {}
}

describe('CallerThrottlerGuard', () => {
  const storage = new ThrottlerStorageService();
  const guard = new CallerThrottlerGuard([{ limit: 1, ttl: 60_000 }], storage, new Reflector());
  const ask = (userId: number | undefined, ip: string) => {
    const request = { ip, headers: {}, user: userId && { userId } };
    const context = {
      getHandler: () => Routes.prototype.ask,
      getClass: () => Routes,
      switchToHttp: () => ({ getRequest: () => request, getResponse: () => ({ header: () => undefined }) }),
    };
    return guard.canActivate(context as unknown as ExecutionContext);
  };

  beforeAll(() => guard.onModuleInit());
  afterAll(() => storage.onApplicationShutdown());

  it('counts a member’s requests together wherever they come from', async () => {
    expect(await ask(1, '10.0.0.1')).toBe(true);
    await expect(ask(1, '10.0.0.2')).rejects.toMatchObject({ status: 429 });
  });

  it('counts members behind one address each for themselves', async () => {
    expect(await ask(2, '10.0.0.1')).toBe(true);
  });

  it('counts strangers by their address', async () => {
    expect(await ask(undefined, '10.0.0.3')).toBe(true);
    await expect(ask(undefined, '10.0.0.3')).rejects.toMatchObject({ status: 429 });
    expect(await ask(undefined, '10.0.0.4')).toBe(true);
  });
});
