import type { Problem } from '@/app/api/v1/_contracts/problem';

/** A refusal by the server, in its own words (RFC 9457). */
export class ApiProblem extends Error {
  override readonly name = 'ApiProblem';

  constructor(readonly problem: Problem) {
    super(problem.detail);
  }
}
