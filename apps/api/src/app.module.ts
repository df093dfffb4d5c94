import { DynamicModule, Module } from '@nestjs/common';
import { APP_FILTER, APP_INTERCEPTOR, APP_PIPE } from '@nestjs/core';
import { ZodSerializerInterceptor, ZodValidationPipe } from 'nestjs-zod';
import { AddedFilesModule } from './added-files/added-files.module';
import { AccessModule } from './access/access.module';
import { AdminModule } from './admin/admin.module';
import { AuthModule } from './auth/auth.module';
import { ComplaintsModule } from './complaints/complaints.module';
import { ComparisonsModule } from './comparisons/comparisons.module';
import { Config } from './config/config';
import { ConfigModule } from './config/config.module';
import { databaseModule } from './database/database.module';
import { AppErrorFilter } from './errors/app-error.filter';
import { EventsModule } from './events/events.module';
import { ExportsModule } from './exports/exports.module';
import { HealthModule } from './health/health.module';
import { loggerModule } from './logging/logger.module';
import { MeasurementsModule } from './measuring/measurements.module';
import { NotesModule } from './notes/notes.module';
import { PhotosModule } from './photos/photos.module';
import { ProgressModule } from './progress/progress.module';
import { ReportsModule } from './reports/reports.module';
import { SampleSheetModule } from './sample-sheet/sample-sheet.module';
import { SetupsModule } from './setups/setups.module';
import { SharesModule } from './shares/shares.module';
import { SoundModule } from './sound/sound.module';
import { TakesModule } from './takes/takes.module';
import { TryOutsModule } from './tryouts/try-outs.module';
import { RoomsModule } from './rooms/rooms.module';
import { UsersModule } from './users/users.module';

@Module({})
export class AppModule {
  static of(config: Config): DynamicModule {
    return {
      module: AppModule,
      imports: [
        ConfigModule.of(config),
        loggerModule,
        databaseModule,
        AccessModule,
        AdminModule,
        AuthModule,
        RoomsModule,
        UsersModule,
        TakesModule,
        SetupsModule,
        PhotosModule,
        MeasurementsModule,
        ReportsModule,
        ComparisonsModule,
        ProgressModule,
        SoundModule,
        AddedFilesModule,
        SharesModule,
        NotesModule,
        ComplaintsModule,
        TryOutsModule,
        SampleSheetModule,
        ExportsModule,
        EventsModule,
        HealthModule,
      ],
      providers: [
        { provide: APP_FILTER, useClass: AppErrorFilter },
        { provide: APP_PIPE, useClass: ZodValidationPipe },
        { provide: APP_INTERCEPTOR, useClass: ZodSerializerInterceptor },
      ],
    };
  }
}
