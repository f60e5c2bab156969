import { Module } from '@nestjs/common';
import { AuthModule } from '../auth/auth.module';
import { MailModule } from '../mail/mail.module';
import { SpecificationsModule } from '../specifications/specifications.module';
import { TrailModule } from '../trail/trail.module';
import { UsersModule } from '../users/users.module';
import { CheckController } from './check.controller';
import { CheckRecordsRepository } from './check-records.repository';
import { ChecksService } from './checks.service';
import { FiguresVeil } from './figures-veil';
import { MovesController } from './moves.controller';
import { PresencesService } from './presences.service';
import { RemarksController } from './remarks.controller';
import { RemarksRepository } from './remarks.repository';
import { RemarksService } from './remarks.service';
import { ReturnsService } from './returns.service';
import { SubmissionsRepository } from './submissions.repository';
import { SubmissionsService } from './submissions.service';
import { WorkflowLetters } from './workflow-letters';

@Module({
  imports: [AuthModule, MailModule, SpecificationsModule, TrailModule, UsersModule],
  controllers: [MovesController, CheckController, RemarksController],
  providers: [
    SubmissionsService,
    SubmissionsRepository,
    ReturnsService,
    ChecksService,
    CheckRecordsRepository,
    RemarksService,
    RemarksRepository,
    PresencesService,
    WorkflowLetters,
    FiguresVeil,
  ],
  exports: [SubmissionsService, ReturnsService, ChecksService, RemarksService, WorkflowLetters],
})
export class WorkflowModule {}
