import { Module } from '@nestjs/common';
import { AccountLinksModule } from '../account-links/account-links.module';
import { AuthModule } from '../auth/auth.module';
import { MailModule } from '../mail/mail.module';
import { ProjectsModule } from '../projects/projects.module';
import { GrantsRepository } from './grants.repository';
import { GrantsService } from './grants.service';
import { UsersController } from './users.controller';
import { UsersRepository } from './users.repository';
import { UsersService } from './users.service';

@Module({
  imports: [AccountLinksModule, AuthModule, MailModule, ProjectsModule],
  controllers: [UsersController],
  providers: [GrantsRepository, GrantsService, UsersRepository, UsersService],
  exports: [GrantsService, UsersService],
})
export class UsersModule {}
