import { Module } from '@nestjs/common';
import { OneTimeTokensService } from './one-time-tokens.service';

@Module({ providers: [OneTimeTokensService], exports: [OneTimeTokensService] })
export class TokensModule {}
