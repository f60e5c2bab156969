import { Module } from '@nestjs/common';
import { AuthModule } from '../auth/auth.module';
import { ProjectsModule } from '../projects/projects.module';
import { GrantsRepository } from './grants.repository';
import { GrantsService } from './grants.service';
import { UsersController } from './users.controller';
import { UsersRepository } from './users.repository';
import { UsersService } from './users.service';

@Module({
  imports: [AuthModule, ProjectsModule],
  controllers: [UsersController],
  providers: [GrantsRepository, GrantsService, UsersRepository, UsersService],
  exports: [UsersService],
})
export class UsersModule {}
