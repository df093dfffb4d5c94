import { Module } from '@nestjs/common';
import { MeasurementsModule } from '../measuring/measurements.module';
import { TryOutPlacesService } from './try-out-places.service';
import { TryOutRankingService } from './try-out-ranking.service';
import { TryOutSetupService } from './try-out-setup.service';
import { TryOutsController } from './try-outs.controller';
import { TryOutsService } from './try-outs.service';

@Module({
  imports: [MeasurementsModule],
  controllers: [TryOutsController],
  providers: [TryOutsService, TryOutPlacesService, TryOutRankingService, TryOutSetupService],
  exports: [TryOutsService, TryOutRankingService],
})
export class TryOutsModule {}
