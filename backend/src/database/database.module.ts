import { Module } from '@nestjs/common';
import { TypeOrmModule } from '@nestjs/typeorm';
import { AppConfig } from '../config/app-config.js';
import { dataSourceOptions } from './data-source-options.js';

const START_ATTEMPTS = 10;
const RETRY_DELAY_MS = 2_000;
const LONGEST_QUERY_MS = 15_000;

@Module({
  imports: [
    TypeOrmModule.forRootAsync({
      inject: [AppConfig],
      useFactory: (config: AppConfig) => ({
        ...dataSourceOptions(config),
        enableQueryTimeout: true,
        maxQueryExecutionTime: LONGEST_QUERY_MS,
        retryAttempts: START_ATTEMPTS,
        retryDelay: RETRY_DELAY_MS,
      }),
    }),
  ],
})
export class DatabaseModule {}
