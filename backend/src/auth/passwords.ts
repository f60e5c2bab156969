import { createHash } from 'node:crypto';
import { Inject, Injectable } from '@nestjs/common';
import { compare, hash } from 'bcryptjs';
import { CONFIG, type Config } from '../platform/config';

/** Salt and digest of no password: unknown accounts take as long as known ones. */
const NOBODY = 'uT1vQmCq0uQH7yL4xkW3eO3m8cS1Jd5vZyR2fN9aXbGhKpLqWtVYi';

@Injectable()
export class Passwords {
  constructor(@Inject(CONFIG) private readonly config: Config) {}

  hash(password: string): Promise<string> {
    return hash(digest(password), this.config.passwordCost);
  }

  /** Takes the same time whether or not there is a hash to compare with. */
  async matches(password: string, passwordHash: string | null): Promise<boolean> {
    const same = await compare(digest(password), passwordHash ?? hashOfNobody(this.config.passwordCost));
    return same && passwordHash !== null;
  }
}

export const hashOfNobody = (cost: number) => `$2b$${String(cost).padStart(2, '0')}$${NOBODY}`;

/** bcrypt reads 72 bytes and stops at a zero byte; a digest in base64 lets every character of a password count. */
function digest(password: string): string {
  return createHash('sha256').update(password, 'utf8').digest('base64');
}
