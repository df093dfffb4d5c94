import { Module } from '@nestjs/common';
import { JwtModule } from '@nestjs/jwt';
import { AuditModule } from '../audit/audit.module';
import { Config } from '../config/config';
import { CONFIG } from '../config/config.module';
import { MailModule } from '../mail/mail.module';
import { SettingsModule } from '../settings/settings.module';
import { ThrottleModule } from '../throttle/throttle.module';
import { TokensModule } from '../tokens/tokens.module';
import { AccountLinksController } from './account-links.controller';
import { AccountLinksService } from './account-links.service';
import { AuthController } from './auth.controller';
import { AuthService } from './auth.service';
import { EmailAddressController } from './email-address.controller';
import { EmailAddressService } from './email-address.service';
import { LocalStrategy } from './local.strategy';
import { OwnPassword } from './own-password';
import { PasswordsService } from './passwords.service';
import { PhoneLinksController } from './phone-links.controller';
import { PhoneLinksService } from './phone-links.service';
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
  imports: [jwt, AuditModule, MailModule, SettingsModule, ThrottleModule, TokensModule],
  controllers: [AuthController, AccountLinksController, EmailAddressController, PhoneLinksController],
  providers: [
    AuthService,
    AccountLinksService,
    PhoneLinksService,
    LocalStrategy,
    PasswordsService,
    OwnPassword,
    EmailAddressService,
    SessionsService,
  ],
  exports: [PasswordsService, SessionsService, OwnPassword],
})
export class AuthModule {}
