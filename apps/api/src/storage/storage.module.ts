import { Module } from '@nestjs/common';
import { ObjectStoreService } from './object-store.service';
import { ScratchService } from './scratch.service';

@Module({ providers: [ObjectStoreService, ScratchService], exports: [ObjectStoreService, ScratchService] })
export class StorageModule {}
