import { Body, Controller, Inject, Param, Req, Res } from '@nestjs/common';
import type { Request, Response } from 'express';
import { contract, type AnswerOf, type BodyOf, type Person } from '@bellgap/common/api';
import { CONFIG, type Config } from '../platform/config';
import { CurrentPerson, MaybePerson, type SignedIn } from '../platform/person';
import { Route } from '../platform/route';
import { clearSessionCookie, setSessionCookie } from '../platform/session-cookie';
import { AuthService } from './auth.service';
import { browserOf } from './client';
import { PasswordResetsService } from './password-resets.service';
import { SessionsService, type Client } from './sessions.service';

@Controller()
export class AuthController {
  constructor(
    private readonly auth: AuthService,
    private readonly sessionsService: SessionsService,
    private readonly resets: PasswordResetsService,
    @Inject(CONFIG) private readonly config: Config,
  ) {}

  @Route(contract.signIn)
  async signIn(
    @Body() { email, password }: BodyOf<typeof contract.signIn>,
    @Req() request: Request,
    @Res({ passthrough: true }) response: Response,
  ): Promise<AnswerOf<typeof contract.signIn>> {
    const { token, expiresAt } = await this.auth.signIn(email, password, clientOf(request));
    setSessionCookie(response, this.config, token, expiresAt);
    return { user: toPerson(await this.sessionsService.read(token, { passive: true })) };
  }

  @Route(contract.currentSession)
  currentSession(@MaybePerson() person: SignedIn | null): AnswerOf<typeof contract.currentSession> {
    return { user: toPerson(person) };
  }

  @Route(contract.signOut)
  async signOut(@CurrentPerson() person: SignedIn, @Res({ passthrough: true }) response: Response): Promise<void> {
    await this.auth.endSession(person, person.sessionId);
    clearSessionCookie(response, this.config);
  }

  @Route(contract.sessions)
  async sessions(@CurrentPerson() person: SignedIn): Promise<AnswerOf<typeof contract.sessions>> {
    const rows = await this.sessionsService.open(person.id);
    return rows.map((row) => ({
      id: row.id,
      current: row.id === person.sessionId,
      createdAt: row.created_at.toISOString(),
      lastActiveAt: row.last_active_at.toISOString(),
      expiresAt: row.expires_at.toISOString(),
      address: row.address,
      browser: browserOf(row.user_agent),
    }));
  }

  @Route(contract.endSession)
  async endSession(@CurrentPerson() person: SignedIn, @Param('id') id: string): Promise<void> {
    await this.auth.endSession(person, id);
  }

  @Route(contract.changePassword)
  async changePassword(
    @CurrentPerson() person: SignedIn,
    @Body() body: BodyOf<typeof contract.changePassword>,
    @Req() request: Request,
  ): Promise<void> {
    await this.auth.changePassword(person, body, clientOf(request));
  }

  @Route(contract.acceptInvitation)
  async acceptInvitation(@Body() { token, password }: BodyOf<typeof contract.acceptInvitation>): Promise<void> {
    await this.auth.acceptInvitation(token, password);
  }

  @Route(contract.requestPasswordReset)
  async requestPasswordReset(
    @Body() { email }: BodyOf<typeof contract.requestPasswordReset>,
    @Req() request: Request,
  ): Promise<void> {
    await this.resets.request(email, clientOf(request));
  }

  @Route(contract.acceptPasswordReset)
  async acceptPasswordReset(@Body() { token, password }: BodyOf<typeof contract.acceptPasswordReset>): Promise<void> {
    await this.auth.acceptPasswordReset(token, password);
  }
}

function clientOf(request: Request): Client {
  return { address: request.ip ?? null, userAgent: request.get('user-agent')?.slice(0, 400) ?? null };
}

function toPerson(person: SignedIn | null): Person | null {
  if (!person) return null;
  const { id, email, name, grants } = person;
  return { id, email, name, roles: [...new Set(grants.map(({ role }) => role))] };
}
