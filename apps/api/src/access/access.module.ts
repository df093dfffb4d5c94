import { Module } from '@nestjs/common';
import { APP_GUARD } from '@nestjs/core';
import { AuthModule } from '../auth/auth.module';
import { ThrottleModule } from '../throttle/throttle.module';
import { AccessGuard } from './access.guard';
import { AccessService } from './access.service';
import { OriginGuard } from './origin.guard';

@Module({
  imports: [AuthModule, ThrottleModule],
  providers: [
    AccessService,
    { provide: APP_GUARD, useClass: OriginGuard },
    { provide: APP_GUARD, useClass: AccessGuard },
  ],
  exports: [AccessService],
})
export class AccessModule {}
