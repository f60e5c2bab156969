import { Module } from '@nestjs/common';
import { SpecificationsModule } from '../specifications/specifications.module';
import { DeskController } from './desk.controller';
import { DeskService } from './desk.service';

@Module({ imports: [SpecificationsModule], controllers: [DeskController], providers: [DeskService] })
export class DeskModule {}
