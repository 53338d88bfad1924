import { Injectable } from '@nestjs/common';
import { ThrottlerGuard } from '@nestjs/throttler';
import type { Request } from 'express';
import type { Caller } from './caller.js';

/** Counts a member's requests together wherever they come from, and others by their address. */
@Injectable()
export class CallerThrottlerGuard extends ThrottlerGuard {
  protected override getTracker(request: Request & { user?: Caller }): Promise<string> {
    return request.user ? Promise.resolve(`user ${request.user.userId}`) : super.getTracker(request);
  }
}
