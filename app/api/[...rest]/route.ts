import type { RouteHandler } from '@/app/_server/http/handle';
import { problemResponse } from '@/app/_server/http/problems';
import { requestIdOf } from '@/app/_server/http/requestId';
import { Refusal } from '@/app/_server/refusal';

/** Every address of the API that no other route answers. */
const answerNotFound: RouteHandler = async (request) =>
  problemResponse(new Refusal({ code: 'not-found' }), requestIdOf(request));

export {
  answerNotFound as DELETE,
  answerNotFound as GET,
  answerNotFound as PATCH,
  answerNotFound as POST,
  answerNotFound as PUT,
};
