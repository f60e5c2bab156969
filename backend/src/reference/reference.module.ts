import { Module } from '@nestjs/common';
import { CompanySettingsModule } from '../company-settings/company-settings.module';
import { ConfirmationsRepository } from './confirmations.repository';
import { ReferenceController } from './reference.controller';
import { ReferenceService } from './reference.service';

@Module({
  imports: [CompanySettingsModule],
  controllers: [ReferenceController],
  providers: [ReferenceService, ConfirmationsRepository],
  exports: [ReferenceService],
})
export class ReferenceModule {}
