import { Module, type DynamicModule } from '@nestjs/common';
import { AuditModule } from './audit/audit.module';
import { AuthModule } from './auth/auth.module';
import { BasisMovesModule } from './basis-moves/basis-moves.module';
import { CatalogueModule } from './catalogue/catalogue.module';
import { CompanySettingsModule } from './company-settings/company-settings.module';
import { DeskModule } from './desk/desk.module';
import { EvaluationsModule } from './evaluations/evaluations.module';
import { HealthModule } from './health/health.module';
import { KnownAnswersModule } from './known-answers/known-answers.module';
import { MailModule } from './mail/mail.module';
import { OpenApiModule } from './openapi/openapi.module';
import { PlatformModule, type PlatformOptions } from './platform/platform.module';
import { ProjectsModule } from './projects/projects.module';
import { QueueModule } from './queue/queue.module';
import { ReferenceModule } from './reference/reference.module';
import { RegisterModule } from './register/register.module';
import { RevisionNotesModule } from './revision-notes/revision-notes.module';
import { SheetsModule } from './sheets/sheets.module';
import { SpecificationsModule } from './specifications/specifications.module';
import { TrailModule } from './trail/trail.module';
import { UsersModule } from './users/users.module';
import { IssueModule } from './workflow/issue.module';
import { WorkflowModule } from './workflow/workflow.module';

@Module({})
export class AppModule {
  static with(options: PlatformOptions): DynamicModule {
    return {
      module: AppModule,
      imports: [
        PlatformModule.with(options),
        AuditModule,
        QueueModule,
        MailModule,
        AuthModule,
        UsersModule,
        CompanySettingsModule,
        ProjectsModule,
        BasisMovesModule,
        ReferenceModule,
        KnownAnswersModule,
        CatalogueModule,
        EvaluationsModule,
        SpecificationsModule,
        RevisionNotesModule,
        SheetsModule,
        RegisterModule,
        TrailModule,
        WorkflowModule,
        IssueModule,
        DeskModule,
        HealthModule,
        OpenApiModule,
      ],
    };
  }
}
