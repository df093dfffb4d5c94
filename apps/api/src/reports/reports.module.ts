import { Module } from '@nestjs/common';
import { ReportTelling } from './report-telling';
import { ReportsController } from './reports.controller';
import { ReportsService } from './reports.service';

@Module({
  controllers: [ReportsController],
  providers: [ReportsService, ReportTelling],
  exports: [ReportsService, ReportTelling],
})
export class ReportsModule {}
