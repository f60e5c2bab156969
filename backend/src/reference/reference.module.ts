import { Module } from '@nestjs/common';
import { CompanySettingsModule } from '../company-settings/company-settings.module';
import { ConfirmationsRepository } from './confirmations.repository';
import { ReferenceController } from './reference.controller';
import { ReferenceService } from './reference.service';
import { TablesController } from './tables.controller';
import { TablesService } from './tables.service';

@Module({
  imports: [CompanySettingsModule],
  controllers: [ReferenceController, TablesController],
  providers: [ReferenceService, TablesService, ConfirmationsRepository],
  exports: [ReferenceService],
})
export class ReferenceModule {}
