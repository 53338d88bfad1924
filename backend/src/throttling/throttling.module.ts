import { Module } from '@nestjs/common';
import { RequestCounts } from './request-counts.service.js';

@Module({
  providers: [RequestCounts],
  exports: [RequestCounts],
})
export class ThrottlingModule {}
