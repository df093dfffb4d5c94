import { Module } from '@nestjs/common';
import { SampleSheetController } from './sample-sheet.controller';

@Module({ controllers: [SampleSheetController] })
export class SampleSheetModule {}
