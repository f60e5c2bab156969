import { Injectable, type CallHandler, type ExecutionContext, type NestInterceptor } from '@nestjs/common';
import { Reflector } from '@nestjs/core';
import type { Response } from 'express';
import { map, type Observable } from 'rxjs';
import * as yup from 'yup';
import type { EndpointDefinition } from '@bellgap/common/api';
import { invalidAt } from './domain-error';
import { ENDPOINT, type VersionedRequest } from './route';
import { Versioned, etagOf, readIfMatch } from './versions';
import { assertValid } from './yup-validation';

const NOTHING = yup.object({}).noUnknown();

/** Holds each request against its endpoint of the contract, and gives versioned answers their ETag. */
@Injectable()
export class ContractInterceptor implements NestInterceptor {
  constructor(private readonly reflector: Reflector) {}

  intercept(context: ExecutionContext, next: CallHandler): Observable<unknown> {
    const endpoint = this.reflector.get<EndpointDefinition | undefined>(ENDPOINT, context.getHandler());
    if (!endpoint) return next.handle();
    const request = context.switchToHttp().getRequest<VersionedRequest>();
    const response = context.switchToHttp().getResponse<Response>();
    if (endpoint.ifMatch) request.ifMatchVersion = readIfMatch(request.get('if-match'));
    checkQuery(endpoint, request.query);
    checkBody(endpoint, request.body);
    response.setHeader('Cache-Control', 'no-store');
    return next.handle().pipe(
      map((answer: unknown) => {
        if (!(answer instanceof Versioned)) return answer;
        response.setHeader('ETag', etagOf(answer.version));
        return answer.answer as unknown;
      }),
    );
  }
}

function checkQuery({ query, file }: EndpointDefinition, given: unknown): void {
  // Addresses of files are opened by browsers and viewers, which may add parameters of their own.
  if (query || !file) assertValid(query ?? NOTHING, { ...(given as object) });
}

function checkBody({ body }: EndpointDefinition, given: unknown): void {
  if (body && given === undefined) throw invalidAt('', 'A JSON body is needed.');
  if (body) assertValid(body, given);
  else if (given !== undefined) assertValid(NOTHING, given);
}
