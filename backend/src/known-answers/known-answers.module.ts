import { Module } from '@nestjs/common';
import { KnownAnswersController } from './known-answers.controller';
import { KnownAnswersService } from './known-answers.service';

@Module({ controllers: [KnownAnswersController], providers: [KnownAnswersService] })
export class KnownAnswersModule {}
