import { mkdirSync } from 'node:fs';
import { Global, Module } from '@nestjs/common';
import { SequelizeModule } from '@nestjs/sequelize';
import { ENV } from '../config/config.module.js';
import type { Env } from '../config/env.js';
import { models } from './models.js';
import { sqliteOptions } from './sqlite-options.js';
import { Writer, WRITER_OPTIONS } from './writer.js';

/** Global: models are used by their class (`User.findOne(…)`), writes go through `Writer` only. */
@Global()
@Module({
  imports: [
    SequelizeModule.forRootAsync({
      inject: [ENV],
      useFactory: (env: Env) => {
        mkdirSync(env.dataDir, { recursive: true, mode: 0o700 });
        return {
          ...sqliteOptions(env.dataDir),
          models,
          autoLoadModels: false,
          synchronize: false,
          retryAttempts: 0,
          // The writer closes it, after all that waits was written.
          autoCloseConnection: false,
        };
      },
    }),
  ],
  providers: [Writer, { provide: WRITER_OPTIONS, useValue: { queueLimit: 5000, groupLimit: 200 } }],
  exports: [Writer],
})
export class DatabaseModule {}
