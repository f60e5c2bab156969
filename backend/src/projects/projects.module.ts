import { Module } from '@nestjs/common';
import { CompanySettingsModule } from '../company-settings/company-settings.module';
import { DesignBasesController } from './design-bases.controller';
import { DesignBasesRepository } from './design-bases.repository';
import { DesignBasesService } from './design-bases.service';
import { ProjectsController } from './projects.controller';
import { ProjectsListQuery } from './projects.list-query';
import { ProjectsRepository } from './projects.repository';
import { ProjectsService } from './projects.service';
import { TowerFamiliesRepository } from './tower-families.repository';

@Module({
  imports: [CompanySettingsModule],
  controllers: [DesignBasesController, ProjectsController],
  providers: [
    DesignBasesRepository,
    DesignBasesService,
    ProjectsListQuery,
    ProjectsRepository,
    ProjectsService,
    TowerFamiliesRepository,
  ],
  exports: [DesignBasesService, ProjectsService],
})
export class ProjectsModule {}
