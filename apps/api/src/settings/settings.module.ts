import { Module } from '@nestjs/common';
import { InstallationService } from './installation.service';
import { SignUpController } from './sign-up.controller';

@Module({
  controllers: [SignUpController],
  providers: [InstallationService],
  exports: [InstallationService],
})
export class SettingsModule {}
