import { Module } from '@nestjs/common';
import { RegisterModule } from '../register/register.module';
import { SpecificationsModule } from '../specifications/specifications.module';
import { SheetsController } from './sheets.controller';
import { SheetsRepository } from './sheets.repository';
import { SheetsService } from './sheets.service';

@Module({
  imports: [RegisterModule, SpecificationsModule],
  controllers: [SheetsController],
  providers: [SheetsService, SheetsRepository],
  exports: [SheetsService],
})
export class SheetsModule {}
