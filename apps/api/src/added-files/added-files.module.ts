import { Module } from '@nestjs/common';
import { QueueModule } from '../queue/queue.module';
import { StorageModule } from '../storage/storage.module';
import { AddedFileQueue } from './added-file-queue';
import { AddedFilesController } from './added-files.controller';
import { AddedFilesService } from './added-files.service';

@Module({
  imports: [QueueModule, StorageModule],
  controllers: [AddedFilesController],
  providers: [AddedFileQueue, AddedFilesService],
  exports: [AddedFilesService],
})
export class AddedFilesModule {}
