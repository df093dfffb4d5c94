import { DynamicModule, Global, Module } from '@nestjs/common';
import { Config } from './config';

export const CONFIG = Symbol('config');

@Global()
@Module({})
export class ConfigModule {
  static of(config: Config): DynamicModule {
    return { module: ConfigModule, providers: [{ provide: CONFIG, useValue: config }], exports: [CONFIG] };
  }
}
