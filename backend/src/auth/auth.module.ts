import { createSecretKey } from 'node:crypto';
import { Module } from '@nestjs/common';
import { APP_GUARD } from '@nestjs/core';
import { JwtModule } from '@nestjs/jwt';
import { AccountLinksModule } from '../account-links/account-links.module';
import { MailModule } from '../mail/mail.module';
import { CONFIG, type Config } from '../platform/config';
import { AccessGuard } from './access-guard';
import { AccountsRepository } from './accounts.repository';
import { AuthController } from './auth.controller';
import { AuthService } from './auth.service';
import { HousekeepingService } from './housekeeping.service';
import { PasswordResetsService } from './password-resets.service';
import { Passwords } from './passwords';
import { SessionsRepository } from './sessions.repository';
import { SessionsService } from './sessions.service';
import { SignaturesService } from './signatures.service';
import { ThrottleService } from './throttle.service';

@Module({
  imports: [
    AccountLinksModule,
    MailModule,
    JwtModule.registerAsync({
      inject: [CONFIG],
      useFactory: ({ sessionSecret }: Config) => {
        // Given as text, the key would be read anew, as a public key first, at each request.
        const key = createSecretKey(Buffer.from(sessionSecret));
        return { secretOrKeyProvider: () => key, signOptions: { algorithm: 'HS256' as const } };
      },
    }),
  ],
  controllers: [AuthController],
  providers: [
    AccountsRepository,
    AuthService,
    HousekeepingService,
    PasswordResetsService,
    Passwords,
    SessionsRepository,
    SessionsService,
    SignaturesService,
    ThrottleService,
    { provide: APP_GUARD, useClass: AccessGuard },
  ],
  exports: [SessionsService, SignaturesService],
})
export class AuthModule {}
