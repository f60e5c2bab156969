import { Injectable, type CanActivate, type ExecutionContext } from '@nestjs/common';
import { Reflector } from '@nestjs/core';
import { PASSIVE_HEADER, type EndpointDefinition } from '@bellgap/common/api';
import { forbidden, notSignedIn } from '../platform/domain-error';
import { holdsAnywhere, type PersonRequest } from '../platform/person';
import { ENDPOINT, OPEN } from '../platform/route';
import { SESSION_COOKIE } from '../platform/session-cookie';
import { SessionsService } from './sessions.service';

/** Finds out who asks, and lets in whom the contract names. A route that says nothing is closed. */
@Injectable()
export class AccessGuard implements CanActivate {
  constructor(
    private readonly reflector: Reflector,
    private readonly sessions: SessionsService,
  ) {}

  async canActivate(context: ExecutionContext): Promise<boolean> {
    const handler = context.getHandler();
    if (this.reflector.get<boolean | undefined>(OPEN, handler)) return true;
    const access = this.reflector.get<EndpointDefinition | undefined>(ENDPOINT, handler)?.access;
    const request = context.switchToHttp().getRequest<PersonRequest>();
    const cookies = request.cookies as Record<string, unknown> | undefined;
    const token = cookies?.[SESSION_COOKIE];
    if (typeof token === 'string') {
      const passive = request.get(PASSIVE_HEADER) === '1';
      request.person = (await this.sessions.read(token, { passive })) ?? undefined;
    }
    if (access === 'open') return true;
    if (!request.person) throw notSignedIn();
    if (access === undefined || (access !== 'signed-in' && !holdsAnywhere(request.person, access))) throw forbidden();
    return true;
  }
}
