import { Module, type DynamicModule } from '@nestjs/common';
import { AuditModule } from './audit/audit.module';
import { AuthModule } from './auth/auth.module';
import { CompanySettingsModule } from './company-settings/company-settings.module';
import { HealthModule } from './health/health.module';
import { OpenApiModule } from './openapi/openapi.module';
import { PlatformModule, type PlatformOptions } from './platform/platform.module';
import { ProjectsModule } from './projects/projects.module';
import { UsersModule } from './users/users.module';

@Module({})
export class AppModule {
  static with(options: PlatformOptions): DynamicModule {
    return {
      module: AppModule,
      imports: [
        PlatformModule.with(options),
        AuditModule,
        AuthModule,
        UsersModule,
        CompanySettingsModule,
        ProjectsModule,
        HealthModule,
        OpenApiModule,
      ],
    };
  }
}
