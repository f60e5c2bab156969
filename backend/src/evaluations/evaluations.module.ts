import { Module } from '@nestjs/common';
import { CatalogueModule } from '../catalogue/catalogue.module';
import { CompanySettingsModule } from '../company-settings/company-settings.module';
import { ReferenceModule } from '../reference/reference.module';
import { EvaluationContextService } from './evaluation-context.service';
import { EvaluationsController } from './evaluations.controller';
import { EvaluationsService } from './evaluations.service';

@Module({
  imports: [CatalogueModule, CompanySettingsModule, ReferenceModule],
  controllers: [EvaluationsController],
  providers: [EvaluationsService, EvaluationContextService],
  exports: [EvaluationsService],
})
export class EvaluationsModule {}
