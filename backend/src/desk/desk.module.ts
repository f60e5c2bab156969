import { Module } from '@nestjs/common';
import { RegisterModule } from '../register/register.module';
import { SpecificationsModule } from '../specifications/specifications.module';
import { IssueModule } from '../workflow/issue.module';
import { DeskController } from './desk.controller';
import { DeskService } from './desk.service';

@Module({
  imports: [IssueModule, RegisterModule, SpecificationsModule],
  controllers: [DeskController],
  providers: [DeskService],
})
export class DeskModule {}
