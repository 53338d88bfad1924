import { Controller, Headers, HttpCode, Post, Req } from '@nestjs/common';
import { ApiNoContentResponse, ApiTags } from '@nestjs/swagger';
import type { Request } from 'express';
import { Public } from '../shared/access/public.decorator.js';
import { BillingEvents } from './billing-events.service.js';

@ApiTags('billing')
@Controller('billing')
export class BillingWebhookController {
  constructor(private readonly events: BillingEvents) {}

  /** The payment service's own address: what lets it in is the signature over the bytes of the body. */
  @Post('webhook')
  @Public()
  @HttpCode(204)
  @ApiNoContentResponse()
  receiveBillingEvent(
    @Req() { body }: Request,
    @Headers('Stripe-Signature') signature: string | undefined,
  ): Promise<void> {
    return this.events.receive(body, signature);
  }
}
