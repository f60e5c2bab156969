import { ExpressAdapter } from '@nestjs/platform-express';
import type { Response } from 'express';
import { Versioned, etagOf } from './versions';

/**
 * Gives versioned answers their ETag. An interceptor could do that too, but one alone sends every request of the product
 * through a chain of observables, which costs more than an evaluation.
 */
export class ApiAdapter extends ExpressAdapter {
  override reply(response: Response, body: unknown, status?: number): unknown {
    if (!(body instanceof Versioned)) return super.reply(response, body, status) as unknown;
    response.setHeader('ETag', etagOf(body.version));
    return super.reply(response, body.answer, status) as unknown;
  }
}
