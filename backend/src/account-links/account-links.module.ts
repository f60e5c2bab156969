import { Module } from '@nestjs/common';
import { AccountLinksService } from './account-links.service';

@Module({ providers: [AccountLinksService], exports: [AccountLinksService] })
export class AccountLinksModule {}
