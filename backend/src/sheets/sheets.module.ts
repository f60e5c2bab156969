import { Module } from '@nestjs/common';
import { SpecificationsModule } from '../specifications/specifications.module';
import { SheetsController } from './sheets.controller';
import { SheetsRepository } from './sheets.repository';
import { SheetsService } from './sheets.service';

@Module({
  imports: [SpecificationsModule],
  controllers: [SheetsController],
  providers: [SheetsService, SheetsRepository],
})
export class SheetsModule {}
