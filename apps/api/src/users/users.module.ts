import { Module } from '@nestjs/common';
import { ReportsModule } from '../reports/reports.module';
import { MeController } from './me.controller';
import { MeService } from './me.service';

@Module({ imports: [ReportsModule], controllers: [MeController], providers: [MeService] })
export class UsersModule {}
