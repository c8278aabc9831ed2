import { Refusal } from '../refusal';
import type { RouteHandler } from './handle';
import { problemResponse } from './problems';
import { requestIdOf } from './requestId';

const METHODS = ['GET', 'POST', 'PUT', 'PATCH', 'DELETE'] as const;
type Method = (typeof METHODS)[number];

/**
 * All methods of one address, for its route file to export: the given ones, and for every other the answer that
 * says which are allowed. (HEAD comes from Next.)
 */
export function route(
  handlers: Partial<Record<Method, RouteHandler>>,
): Record<Method | 'OPTIONS', RouteHandler> {
  const allowed = METHODS.filter((method) => handlers[method]);
  const refuse: RouteHandler = async (request) =>
    problemResponse(new Refusal({ code: 'method-not-allowed', allowed }), requestIdOf(request));
  const options: RouteHandler = async () =>
    new Response(null, { status: 204, headers: { allow: allowed.join(', ') } });
  const others = { GET: refuse, POST: refuse, PUT: refuse, PATCH: refuse, DELETE: refuse };
  return { ...others, OPTIONS: options, ...handlers };
}
