import type { z } from 'zod';
import type { ProblemCode } from '../_contracts/problem';

/** One successful answer of an endpoint. */
export interface Answer {
  readonly description: string;
  /** Left out for answers without a body and for files. */
  readonly schema?: z.ZodType;
  /** `application/json` unless stated. */
  readonly mediaType?: string;
  readonly headers?: Readonly<Record<string, string>>;
}

/**
 * One method of one address: what it takes, what it answers and who may call it. Requests are read by it, the
 * OpenAPI description is made from it, and the tests walk all of them, so the three cannot differ.
 */
export interface Endpoint {
  readonly method: 'get' | 'post' | 'put' | 'delete';
  /** Below `/api/v1`, with `{names}` of path parameters. */
  readonly path: string;
  readonly operationId: string;
  readonly summary: string;
  readonly tag: 'service' | 'people' | 'shows' | 'recipes' | 'drafts' | 'versions' | 'builds';
  /** `public` needs no session; what a signed-in person may do is the policy's matter. */
  readonly access: 'public' | 'signed-in';
  readonly params?: z.ZodObject;
  readonly query?: z.ZodObject;
  readonly body?: z.ZodType;
  /** Request headers with a meaning of their own, and that meaning. */
  readonly headers?: Readonly<Record<string, string>>;
  readonly answers: Readonly<Record<number, Answer>>;
  /** Problems beyond those that every endpoint can have. */
  readonly problems: readonly ProblemCode[];
}

/** Keeps the exact types of an endpoint's schemas, which its handler is typed by. */
export function defineEndpoint<const Described extends Endpoint>(endpoint: Described): Described {
  return endpoint;
}
