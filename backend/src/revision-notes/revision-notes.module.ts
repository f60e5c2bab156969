import { Module } from '@nestjs/common';
import { SpecificationsModule } from '../specifications/specifications.module';
import { RevisionNotesController } from './revision-notes.controller';
import { RevisionNotesRepository } from './revision-notes.repository';
import { RevisionNotesService } from './revision-notes.service';

@Module({
  imports: [SpecificationsModule],
  controllers: [RevisionNotesController],
  providers: [RevisionNotesService, RevisionNotesRepository],
})
export class RevisionNotesModule {}
