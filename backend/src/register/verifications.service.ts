import { Injectable, Logger, type OnApplicationBootstrap, type OnApplicationShutdown } from '@nestjs/common';
import { readVerificationCode, type Verification } from '@bellgap/common/api';
import { networkOf } from '../auth/throttle.service';
import { Clock } from '../platform/clock';
import { tooManyRequests } from '../platform/domain-error';
import { siteDay } from '../platform/site-day';
import { IssuedSheetsRepository } from './issued-sheets.repository';
import { VerificationsRepository } from './verifications.repository';

export const LOOK_UPS = { perAddress: 30, windowS: 60 } as const;

const HOUR_MS = 3_600_000;

const UNKNOWN: Verification = {
  standing: 'unknown',
  number: null,
  revision: null,
  issuedOn: null,
  contentCode: null,
  supersededBy: null,
  since: null,
};

/** Is a print still good? Whoever holds one may ask; he learns what stands on it, and what became of it. */
@Injectable()
export class VerificationsService implements OnApplicationBootstrap, OnApplicationShutdown {
  private readonly logger = new Logger('Verifications');
  private timer: NodeJS.Timeout | undefined;

  constructor(
    private readonly clock: Clock,
    private readonly lookUps: VerificationsRepository,
    private readonly sheets: IssuedSheetsRepository,
  ) {}

  onApplicationBootstrap(): void {
    this.timer = setInterval(
      () => void this.tidy().catch((error: unknown) => this.logger.warn(String(error))),
      HOUR_MS,
    );
    this.timer.unref();
  }

  onApplicationShutdown(): void {
    clearInterval(this.timer);
  }

  async tidy(): Promise<void> {
    await this.lookUps.forget(new Date(this.clock.now().getTime() - HOUR_MS));
  }

  async lookUp(typed: string, address: string): Promise<Verification> {
    await this.refuseGuessing(networkOf(address));
    const code = readVerificationCode(typed);
    const sheet = code === null ? null : await this.sheets.findByCode(code);
    if (!sheet) return UNKNOWN;
    return {
      standing: sheet.standing,
      number: sheet.number,
      revision: sheet.label,
      issuedOn: siteDay(sheet.drawn_at, sheet.site_time_zone),
      contentCode: sheet.content_code,
      supersededBy: sheet.standing === 'current' ? null : sheet.current_label,
      since: (sheet.standing_since ?? sheet.drawn_at).toISOString(),
    };
  }

  private async refuseGuessing(address: string): Promise<void> {
    const at = this.clock.now();
    const since = new Date(at.getTime() - LOOK_UPS.windowS * 1000);
    const oldest = await this.lookUps.count(address, { at, since, atMost: LOOK_UPS.perAddress });
    if (oldest) throw tooManyRequests((oldest.getTime() - since.getTime()) / 1000);
  }
}
