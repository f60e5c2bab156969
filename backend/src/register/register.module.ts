import { Module } from '@nestjs/common';
import { ConcessionsRepository } from './concessions.repository';
import { ConcessionsService } from './concessions.service';
import { IssuedSheetsRepository } from './issued-sheets.repository';
import { IssuedSheetsService } from './issued-sheets.service';
import { RegisterController } from './register.controller';
import { RegisterListQuery } from './register.list-query';
import { RegisterService } from './register.service';
import { VerificationsController } from './verifications.controller';
import { VerificationsRepository } from './verifications.repository';
import { VerificationsService } from './verifications.service';

@Module({
  controllers: [RegisterController, VerificationsController],
  providers: [
    ConcessionsRepository,
    ConcessionsService,
    IssuedSheetsRepository,
    IssuedSheetsService,
    RegisterListQuery,
    RegisterService,
    VerificationsRepository,
    VerificationsService,
  ],
  exports: [ConcessionsService, IssuedSheetsService, RegisterService],
})
export class RegisterModule {}
