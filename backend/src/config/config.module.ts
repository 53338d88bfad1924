import { Global, Module } from '@nestjs/common';
import { AppConfig } from './app-config.js';
import { readConfig } from './read-config.js';

@Global()
@Module({
  providers: [{ provide: AppConfig, useFactory: () => readConfig() }],
  exports: [AppConfig],
})
export class ConfigModule {}
