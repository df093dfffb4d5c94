import { DynamicModule, Module } from '@nestjs/common';
import { AddedFileClaims } from './added-files/added-file-claims';
import { AddedFileQueue } from './added-files/added-file-queue';
import { AddedFileRuns } from './added-files/added-file-runs';
import { AddingWorker } from './added-files/adding-worker';
import { Config } from './config/config';
import { ConfigModule } from './config/config.module';
import { databaseModule } from './database/database.module';
import { ExportClaims } from './exports/export-claims';
import { ExportQueue } from './exports/export-queue';
import { ExportRuns } from './exports/export-runs';
import { ExportWorker } from './exports/export-worker';
import { AccountPurge } from './housekeeping/account-purge';
import { ExportPurge } from './housekeeping/export-purge';
import { HousekeepingService } from './housekeeping/housekeeping.service';
import { StoreRepair } from './housekeeping/store-repair';
import { TakePurge } from './housekeeping/take-purge';
import { loggerModule } from './logging/logger.module';
import { AccountMailWriter } from './mail/account-mail-writer';
import { ChosenMail } from './mail/chosen-mail';
import { DigestMailWriter } from './mail/digest-mail-writer';
import { Digests } from './mail/digests';
import { InvitationMailWriter } from './mail/invitation-mail-writer';
import { MailQueue } from './mail/mail-queue';
import { MailWorker } from './mail/mail-worker';
import { MailWriter } from './mail/mail-writer';
import { NoteMailWriter } from './mail/note-mail-writer';
import { Mailer } from './mail/mailer';
import { OpenedMailWriter } from './mail/opened-mail-writer';
import { ShareMailWriter } from './mail/share-mail-writer';
import { MeasurePool } from './measuring/measure-pool';
import { MeasureQueue } from './measuring/measure-queue';
import { MeasurementClaims } from './measuring/measurement-claims';
import { MeasurementRenewals } from './measuring/measurement-renewals';
import { MeasurementSweep } from './measuring/measurement-sweep';
import { MeasuringRuns } from './measuring/measuring-runs';
import { MeasuringWorker } from './measuring/measuring-worker';
import { RenewalWorker } from './measuring/renewal-worker';
import { TakeFetcher } from './measuring/take-fetcher';
import { TakeOutlines } from './measuring/take-outlines';
import { QueueSender } from './queue/queue-sender';
import { ReportTelling } from './reports/report-telling';
import { StorageModule } from './storage/storage.module';
import { OneTimeTokensService } from './tokens/one-time-tokens.service';

/** The worker process: no HTTP, only what measures, sends mails and tidies up. */
@Module({})
export class WorkerModule {
  static of(config: Config): DynamicModule {
    return {
      module: WorkerModule,
      imports: [ConfigModule.of(config), loggerModule, databaseModule, StorageModule],
      providers: [
        QueueSender,
        MeasureQueue,
        MeasurePool,
        MeasurementClaims,
        MeasurementSweep,
        TakeFetcher,
        TakeOutlines,
        MeasuringRuns,
        MeasuringWorker,
        MeasurementRenewals,
        RenewalWorker,
        ReportTelling,
        AddedFileQueue,
        AddedFileClaims,
        AddedFileRuns,
        AddingWorker,
        OneTimeTokensService,
        Mailer,
        ExportQueue,
        ExportClaims,
        ExportRuns,
        ExportWorker,
        ChosenMail,
        DigestMailWriter,
        InvitationMailWriter,
        MailQueue,
        Digests,
        AccountMailWriter,
        NoteMailWriter,
        ShareMailWriter,
        OpenedMailWriter,
        MailWriter,
        MailWorker,
        TakePurge,
        StoreRepair,
        AccountPurge,
        ExportPurge,
        HousekeepingService,
      ],
    };
  }
}
