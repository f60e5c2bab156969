import { Module } from '@nestjs/common';
import { AuthModule } from '../auth/auth.module';
import { MailModule } from '../mail/mail.module';
import { ProjectsModule } from '../projects/projects.module';
import { UsersModule } from '../users/users.module';
import { BasisLetters } from './basis-letters';
import { BasisMovesController } from './basis-moves.controller';
import { BasisMovesService } from './basis-moves.service';

/** The way of a design basis from draft to issued. */
@Module({
  imports: [AuthModule, MailModule, ProjectsModule, UsersModule],
  controllers: [BasisMovesController],
  providers: [BasisLetters, BasisMovesService],
  exports: [BasisMovesService],
})
export class BasisMovesModule {}
