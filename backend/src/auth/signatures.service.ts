import { Inject, Injectable } from '@nestjs/common';
import type { Knex } from 'knex';
import { invalidAt } from '../platform/domain-error';
import { KNEX } from '../platform/knex';
import type { SignedIn } from '../platform/person';
import { AccountsRepository } from './accounts.repository';
import { Passwords } from './passwords';
import { ThrottleService } from './throttle.service';

/** A signature is the password given again, by whoever is signed in. Guessing at it is slowed down as at signing in. */
@Injectable()
export class SignaturesService {
  constructor(
    @Inject(KNEX) private readonly knex: Knex,
    private readonly accounts: AccountsRepository,
    private readonly passwords: Passwords,
    private readonly throttle: ThrottleService,
  ) {}

  /** Refuses a wrong password at `password`. Asked before the transaction that it signs, which it would only keep waiting. */
  async confirm({ id, email }: SignedIn, password: string, address: string): Promise<void> {
    const attempt = await this.throttle.begin(email, address, 'signature');
    const account = await this.accounts.find(id);
    if (!account?.active || !(await this.passwords.matches(password, account.passwordHash))) {
      throw invalidAt('password', 'Password: is not right');
    }
    await this.knex.transaction((db) => this.throttle.succeed(attempt, db));
  }
}
