import { Module } from '@nestjs/common';
import { MailModule } from '../mail/mail.module';
import { ProjectsModule } from '../projects/projects.module';
import { UsersModule } from '../users/users.module';
import { LastSealLettersService } from './last-seal-letters.service';
import { LastSealService } from './last-seal.service';
import { SealingTimerService } from './sealing-timer.service';
import { SealingService } from './sealing.service';
import { SealsRepository } from './seals.repository';
import { TrailVeils } from './trail-veils';
import { TrailVerificationsService } from './trail-verifications.service';
import { TrailController } from './trail.controller';
import { TrailRepository } from './trail.repository';
import { TrailService } from './trail.service';

export { TrailVeils };

@Module({
  imports: [MailModule, ProjectsModule, UsersModule],
  controllers: [TrailController],
  providers: [
    TrailService,
    TrailRepository,
    TrailVeils,
    TrailVerificationsService,
    SealsRepository,
    SealingService,
    SealingTimerService,
    LastSealService,
    LastSealLettersService,
  ],
  exports: [LastSealService, TrailVeils],
})
export class TrailModule {}
