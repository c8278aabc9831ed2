import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { problemSchema } from '@/app/api/v1/_contracts/problem';
import type { Role } from '@/app/api/v1/_contracts/show';
import { endpoints } from '@/app/api/v1/_endpoints/all';
import type { Endpoint } from '@/app/api/v1/_endpoints/Endpoint';
import { type ApiRequest, callApi, sessionCookie, startApplication } from '../support/api';
import { SOUND_TEXT } from '../support/recipeTexts';
import type { TestDatabase } from '../support/testDatabase';
import { createWorld, ROLES, type World } from '../support/world';

let test: TestDatabase;
let world: World;

beforeAll(async () => {
  test = await startApplication();
  world = await createWorld(test.database);
});

afterAll(async () => {
  await test.drop();
});

const AUTHORS: readonly Role[] = ['admin', 'reviewer', 'rigger'];

/** For each operation a request that is right in every way but perhaps who sends it, and who may send it. */
interface Case {
  readonly may: readonly Role[];
  readonly request?: (world: World, role: string) => ApiRequest;
  /** Status when allowed, where it is not 200. */
  readonly status?: number;
}

const inShow = (world: World): ApiRequest => ({ params: { slug: world.slug } });
const inRecipe = (world: World): ApiRequest => ({ params: { recipeId: world.recipeId } });
const inVersion = (world: World): ApiRequest => ({ params: { recipeId: world.recipeId, number: '1' } });

const CASES: Readonly<Record<string, Case>> = {
  readMe: { may: ROLES },
  listShows: { may: ROLES },
  listRecipes: { may: ROLES, request: inShow },
  createRecipe: {
    may: AUTHORS,
    status: 201,
    request: (world, role) => ({
      ...inShow(world),
      body: { name: `by_${role}`, title: 'New', text: SOUND_TEXT, message: 'First' },
    }),
  },
  readRecipe: { may: ROLES, request: inRecipe },
  // In the order of the list: a draft is stored after it was not found, and dropped after that.
  readDraft: { may: AUTHORS, status: 404, request: inRecipe },
  putDraft: {
    may: AUTHORS,
    request: (world) => ({
      ...inRecipe(world),
      body: { text: 'x', basedOn: 1 },
      headers: { 'if-none-match': '*' },
    }),
  },
  deleteDraft: { may: AUTHORS, status: 204, request: inRecipe },
  listVersions: { may: ROLES, request: inRecipe },
  createVersion: {
    may: AUTHORS,
    // The first to come saves version 2; those after it are refused as stale, so they were let in too.
    status: 201,
    request: (world) => ({ ...inRecipe(world), body: { parent: 1, message: 'Next', text: SOUND_TEXT } }),
  },
  readVersion: { may: ROLES, request: inVersion },
  readBuild: { may: ROLES, request: inVersion },
  readBuildFile: {
    may: ROLES,
    request: (world) => ({
      params: { recipeId: world.recipeId, number: '1', name: 'mail_cart.slip' },
    }),
  },
  readBuildArchive: { may: ROLES, request: inVersion },
};

const closed = endpoints.filter(({ access }) => access === 'signed-in');

function caseOf({ operationId }: Endpoint): Case {
  const found = CASES[operationId];
  if (!found) throw new Error(`the access table lacks ${operationId}`);
  return found;
}

async function send(endpoint: Endpoint, who: Role | 'stranger' | 'anonymous'): Promise<Response> {
  const request = caseOf(endpoint).request?.(world, who) ?? {};
  return callApi(endpoint, who === 'anonymous' ? request : { ...request, as: world.people[who] });
}

async function problemCode(response: Response): Promise<string> {
  expect(response.headers.get('content-type')).toBe('application/problem+json');
  return problemSchema.parse(await response.json()).code;
}

describe('every endpoint', () => {
  it('that needs a session stands in this table, and nothing else does', () => {
    expect(Object.keys(CASES).toSorted()).toEqual(closed.map(({ operationId }) => operationId).toSorted());
  });

  describe.each(closed.map((endpoint) => [endpoint.operationId, endpoint] as const))('%s', (_, endpoint) => {
    it.each(ROLES)('answers a %s as the table says', async (role) => {
      const { may, status = 200 } = caseOf(endpoint);
      const response = await send(endpoint, role);
      if (!may.includes(role)) {
        expect(response.status).toBe(403);
        expect(await problemCode(response)).toBe('forbidden');
      } else if (endpoint.operationId === 'createVersion' && role !== ROLES[0]) {
        expect(await problemCode(response)).toBe('stale-parent');
      } else {
        expect(response.status).toBe(status);
        const schema = endpoint.answers[status]?.schema;
        if (schema) schema.parse(await response.json());
      }
    });

    it('tells somebody without a session to sign in', async () => {
      const response = await send(endpoint, 'anonymous');
      expect(response.status).toBe(401);
      expect(await problemCode(response)).toBe('not-signed-in');
    });

    it('takes no cookie that was signed with another secret, and none of a person who is gone', async () => {
      const request = caseOf(endpoint).request?.(world, 'anonymous') ?? {};
      for (const cookie of [
        await sessionCookie(world.people.admin, 'another secret'),
        await sessionCookie(crypto.randomUUID()),
        await sessionCookie('not an id'),
      ]) {
        const response = await callApi(endpoint, { ...request, headers: { ...request.headers, cookie } });
        expect(response.status).toBe(401);
      }
    });

    if (endpoint.params) {
      it('answers a stranger exactly as if there were nothing', async () => {
        const foreign = await send(endpoint, 'stranger');
        expect(foreign.status).toBe(404);
        const foreignProblem = problemSchema.parse(await foreign.json());
        const request = caseOf(endpoint).request?.(world, 'stranger') ?? {};
        const missing = await callApi(endpoint, {
          ...request,
          params: { ...request.params, slug: 'nowhere', recipeId: crypto.randomUUID() },
          as: world.people.admin,
        });
        expect(missing.status).toBe(404);
        const missingProblem = problemSchema.parse(await missing.json());
        expect({ ...foreignProblem, requestId: '' }).toEqual({ ...missingProblem, requestId: '' });
      });
    }
  });

  it('that is public answers without a session', async () => {
    for (const endpoint of endpoints.filter(({ access }) => access === 'public')) {
      const response = await callApi(endpoint);
      expect(response.status).toBe(200);
      endpoint.answers[200]?.schema?.parse(await response.json());
    }
  });
});

describe('a list of shows', () => {
  it('holds the viewer’s own and no other', async () => {
    const endpoint = closed.find(({ operationId }) => operationId === 'listShows');
    if (!endpoint) throw new Error('there is no list of shows');
    const slugs = async (who: Role | 'stranger') => {
      const { items } = await (await send(endpoint, who)).json();
      return items.map(({ slug, role }: { slug: string; role: string }) => [slug, role]);
    };
    expect(await slugs('viewer')).toEqual([['first', 'viewer']]);
    expect(await slugs('stranger')).toEqual([['second', 'admin']]);
  });
});
