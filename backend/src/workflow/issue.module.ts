import { Module } from '@nestjs/common';
import { AuthModule } from '../auth/auth.module';
import { CatalogueModule } from '../catalogue/catalogue.module';
import { CompanySettingsModule } from '../company-settings/company-settings.module';
import { MailModule } from '../mail/mail.module';
import { ProjectsModule } from '../projects/projects.module';
import { RegisterModule } from '../register/register.module';
import { SheetsModule } from '../sheets/sheets.module';
import { SpecificationsModule } from '../specifications/specifications.module';
import { TrailModule } from '../trail/trail.module';
import { UsersModule } from '../users/users.module';
import { ApprovalService } from './approval.service';
import { IssueHistoryRepository } from './issue-history.repository';
import { IssueLetters } from './issue-letters';
import { IssueRecordService } from './issue-record.service';
import { IssueController } from './issue.controller';
import { IssueService } from './issue.service';
import { LaterChangesService } from './later-changes.service';
import { WaitingRepository } from './waiting.repository';
import { WaitingService } from './waiting.service';
import { WithdrawalsService } from './withdrawals.service';
import { WorkflowModule } from './workflow.module';

/** Approval, issue and withdrawal: the end of the way, where sheets and the register come in. */
@Module({
  imports: [
    AuthModule,
    CatalogueModule,
    CompanySettingsModule,
    MailModule,
    ProjectsModule,
    RegisterModule,
    SheetsModule,
    SpecificationsModule,
    TrailModule,
    UsersModule,
    WorkflowModule,
  ],
  controllers: [IssueController],
  providers: [
    ApprovalService,
    IssueHistoryRepository,
    IssueLetters,
    IssueRecordService,
    IssueService,
    LaterChangesService,
    WaitingRepository,
    WaitingService,
    WithdrawalsService,
  ],
  exports: [IssueService, WaitingService, WithdrawalsService],
})
export class IssueModule {}
