import { Module } from '@nestjs/common';
import { EvaluationsModule } from '../evaluations/evaluations.module';
import { ProjectsModule } from '../projects/projects.module';
import { RevisionsRepository } from './revisions.repository';
import { SpecificationsController } from './specifications.controller';
import { SpecificationsListQuery } from './specifications.list-query';
import { SpecificationsService } from './specifications.service';

@Module({
  imports: [ProjectsModule, EvaluationsModule],
  controllers: [SpecificationsController],
  providers: [SpecificationsService, RevisionsRepository, SpecificationsListQuery],
  exports: [SpecificationsService],
})
export class SpecificationsModule {}
