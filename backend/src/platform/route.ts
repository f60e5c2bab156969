import {
  HttpCode,
  RequestMapping,
  RequestMethod,
  SetMetadata,
  UseGuards,
  createParamDecorator,
  type ExecutionContext,
  type StreamableFile,
} from '@nestjs/common';
import { API_PREFIX, type AnswerOf, type EndpointDefinition } from '@bellgap/common/api';
import { ContractGuard, type VersionedRequest } from './contract-guard';
import type { Versioned } from './versions';

export const ENDPOINT = Symbol('endpoint');
export const OPEN = Symbol('open');

type Answer<E extends EndpointDefinition> = E extends { file: string }
  ? StreamableFile
  : E extends { answer: unknown }
    ? AnswerOf<E> | Versioned<AnswerOf<E>>
    : void;

/** The part of a property descriptor that decides what a method answers. */
interface Method<E extends EndpointDefinition> {
  // eslint-disable-next-line @typescript-eslint/no-explicit-any -- parameters come from decorators of their own
  value?: (...parameters: any[]) => Answer<E> | Promise<Answer<E>>;
}

/**
 * Makes a controller method of an endpoint of the contract: its address, status, access and the schemas of query and
 * body, all checked before the method runs. What the method answers must be what the contract says.
 */
export function Route<E extends EndpointDefinition>(endpoint: E) {
  return (target: object, key: string, method: Method<E>): void => {
    const descriptor = method as PropertyDescriptor;
    const path = `${API_PREFIX}${endpoint.path}`;
    RequestMapping({ path, method: RequestMethod[endpoint.method] })(target, key, descriptor);
    HttpCode(endpoint.success)(target, key, descriptor);
    SetMetadata(ENDPOINT, endpoint)(target, key, descriptor);
    UseGuards(new ContractGuard(endpoint))(target, key, descriptor);
  };
}

/** A route outside the contract that strangers may call. */
export const Open = () => SetMetadata(OPEN, true);

/** Version that the request was made from, of an endpoint that asks for If-Match. */
export const IfMatch = createParamDecorator((_: unknown, context: ExecutionContext): number => {
  const { ifMatchVersion } = context.switchToHttp().getRequest<VersionedRequest>();
  if (ifMatchVersion === undefined) throw new Error('IfMatch on an endpoint without ifMatch in its contract');
  return ifMatchVersion;
});
