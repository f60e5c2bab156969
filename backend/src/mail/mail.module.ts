import { Module } from '@nestjs/common';
import { AccountLinksModule } from '../account-links/account-links.module';
import { DeliveryService } from './delivery.service';
import { MailService } from './mail.service';
import { RecipientsRepository } from './recipients.repository';

@Module({
  imports: [AccountLinksModule],
  providers: [DeliveryService, MailService, RecipientsRepository],
  exports: [MailService],
})
export class MailModule {}
