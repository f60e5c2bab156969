import type { CanActivate, ExecutionContext } from '@nestjs/common';
import type { Request, Response } from 'express';
import * as yup from 'yup';
import type { EndpointDefinition } from '@bellgap/common/api';
import { invalidAt } from './domain-error';
import { readIfMatch } from './versions';
import { assertValid } from './yup-validation';

const NOTHING = yup.object({}).noUnknown();

/** A request whose If-Match has been read. */
export type VersionedRequest = Request & { ifMatchVersion?: number };

/** Holds each request against its endpoint of the contract. It stands on the route, so that access is decided before. */
export class ContractGuard implements CanActivate {
  constructor(private readonly endpoint: EndpointDefinition) {}

  canActivate(context: ExecutionContext): boolean {
    const request = context.switchToHttp().getRequest<VersionedRequest>();
    if (this.endpoint.ifMatch) request.ifMatchVersion = readIfMatch(request.get('if-match'));
    checkQuery(this.endpoint, request.query);
    checkBody(this.endpoint, request.body);
    context.switchToHttp().getResponse<Response>().setHeader('Cache-Control', 'no-store');
    return true;
  }
}

function checkQuery({ query, file }: EndpointDefinition, given: object): void {
  if (query) assertValid(query, { ...given });
  // Addresses of files are opened by browsers and viewers, which may add parameters of their own.
  else if (!file && Object.keys(given).length > 0) assertValid(NOTHING, { ...given });
}

function checkBody({ body }: EndpointDefinition, given: unknown): void {
  if (body && given === undefined) throw invalidAt('', 'A JSON body is needed.');
  if (body) assertValid(body, given);
  else if (given !== undefined) assertValid(NOTHING, given);
}
