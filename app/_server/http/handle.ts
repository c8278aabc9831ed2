import type { NextRequest } from 'next/server';
import type { z } from 'zod';
import type { Endpoint } from '@/app/api/v1/_endpoints/Endpoint';
import { type Caller, demandViewer } from '../caller';
import { readEnvironment } from '../env';
import { log } from '../log';
import { Refusal } from '../refusal';
import { callerOf, nobody } from './callerOf';
import { demandOwnOrigin } from './demandOwnOrigin';
import { parseInput } from './parseInput';
import { problemResponse } from './problems';
import { readJsonBody } from './readJsonBody';
import { requestIdOf } from './requestId';

type Output<Schema> = Schema extends z.ZodType ? z.output<Schema> : undefined;
type PartOf<Described extends Endpoint, Part extends 'params' | 'query' | 'body'> = Output<
  Described extends { readonly [Name in Part]: infer Schema } ? Schema : undefined
>;

/** A request that was read by its endpoint's schemas. */
export interface Call<Described extends Endpoint> {
  readonly request: NextRequest;
  readonly caller: Caller;
  readonly params: PartOf<Described, 'params'>;
  readonly query: PartOf<Described, 'query'>;
  readonly body: PartOf<Described, 'body'>;
}

/** What Next hands a route beside the request. */
export interface RouteContext {
  readonly params: Promise<unknown>;
}

export type RouteHandler = (request: NextRequest, context: RouteContext) => Promise<Response>;

/** Path parameters in a form that no subject can have name nothing, so they are not found. */
function readParams({ params: schema }: Endpoint, given: unknown): unknown {
  if (!schema) return undefined;
  const read = schema.safeParse(given);
  if (!read.success) throw new Refusal({ code: 'not-found' });
  return read.data;
}

/** A name given twice keeps its last value. */
function readQuery({ query: schema }: Endpoint, request: NextRequest): unknown {
  return schema && parseInput('query', schema, Object.fromEntries(request.nextUrl.searchParams));
}

async function readBody({ body: schema }: Endpoint, request: NextRequest): Promise<unknown> {
  return schema && parseInput('body', schema, await readJsonBody(request));
}

/**
 * Makes a route handler of an endpoint: reads who asks and what by the endpoint's own schemas, lets `answer` do
 * the work, and turns whatever is thrown into a problem. Nobody learns the cause of a fault but the log.
 */
export function handle<const Described extends Endpoint>(
  endpoint: Described,
  answer: (call: Call<Described>) => Promise<Response> | Response,
): RouteHandler {
  return async (request, context) => {
    const began = performance.now();
    const requestId = requestIdOf(request);
    const respond = async (): Promise<Response> => {
      demandOwnOrigin(request, readEnvironment().origin);
      const caller = endpoint.access === 'public' ? nobody(request) : await callerOf(request);
      if (endpoint.access === 'signed-in') demandViewer(caller);
      const call = {
        request,
        caller,
        params: readParams(endpoint, await context.params),
        query: readQuery(endpoint, request),
        body: await readBody(endpoint, request),
      };
      // Each part was read by the schema that its type is derived from; TypeScript cannot follow that through.
      const response = await answer(call as Call<Described>);
      response.headers.set('x-request-id', requestId);
      return response;
    };
    const response = await respond().catch((thrown: unknown) => {
      if (!(thrown instanceof Refusal)) {
        const cause = thrown instanceof Error ? (thrown.stack ?? thrown.message) : String(thrown);
        log('error', 'request.failed', { requestId, operation: endpoint.operationId, cause });
      }
      return problemResponse(thrown, requestId);
    });
    log('info', 'request', {
      requestId,
      operation: endpoint.operationId,
      status: response.status,
      milliseconds: Math.round(performance.now() - began),
    });
    return response;
  };
}
