import { Module } from '@nestjs/common';
import { JwtModule } from '@nestjs/jwt';
import { AuditModule } from '../audit/audit.module';
import { Config } from '../config/config';
import { CONFIG } from '../config/config.module';
import { ThrottleModule } from '../throttle/throttle.module';
import { AuthController } from './auth.controller';
import { AuthService } from './auth.service';
import { LocalStrategy } from './local.strategy';
import { PasswordsService } from './passwords.service';
import { SessionsService } from './sessions.service';

const jwt = JwtModule.registerAsync({
  inject: [CONFIG],
  useFactory: (config: Config) => ({
    secret: config.jwtSecret,
    signOptions: { algorithm: 'HS256', expiresIn: '15m' },
    verifyOptions: { algorithms: ['HS256'] },
  }),
});

@Module({
  imports: [jwt, AuditModule, ThrottleModule],
  controllers: [AuthController],
  providers: [AuthService, LocalStrategy, PasswordsService, SessionsService],
  exports: [SessionsService],
})
export class AuthModule {}
