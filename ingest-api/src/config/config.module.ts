import { type DynamicModule, Global, Module } from '@nestjs/common';
import type { Env } from './env.js';

/** Injection token of the settings: `@Inject(ENV) env: Env`. */
export const ENV = Symbol('ENV');

/** Injection token of the clock, a function that gives epoch milliseconds; tests hand in their own. */
export const CLOCK = Symbol('CLOCK');
export type Clock = () => number;

@Global()
@Module({})
export class ConfigModule {
  static for(env: Env, clock: Clock): DynamicModule {
    return {
      module: ConfigModule,
      providers: [
        { provide: ENV, useValue: env },
        { provide: CLOCK, useValue: clock },
      ],
      exports: [ENV, CLOCK],
    };
  }
}
