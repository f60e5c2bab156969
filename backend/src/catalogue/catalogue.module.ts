import { Module } from '@nestjs/common';
import { CatalogueController } from './catalogue.controller';
import { CatalogueService } from './catalogue.service';
import { ConductorsRepository } from './conductors.repository';
import { InsulatorsRepository } from './insulators.repository';

@Module({
  controllers: [CatalogueController],
  providers: [CatalogueService, InsulatorsRepository, ConductorsRepository],
  exports: [CatalogueService],
})
export class CatalogueModule {}
