import { Module } from '@nestjs/common';
import { MeasurementsModule } from '../measuring/measurements.module';
import { TryOutRankingService } from './try-out-ranking.service';
import { TryOutsController } from './try-outs.controller';
import { TryOutsService } from './try-outs.service';

@Module({
  imports: [MeasurementsModule],
  controllers: [TryOutsController],
  providers: [TryOutsService, TryOutRankingService],
})
export class TryOutsModule {}
