import { beforeEach, describe, expect, it, vi } from 'vitest';
import { z } from 'zod';
import { endpoint, largestBody } from '@/app/_endpoint';
import type { Actor } from '@/modules/access';
import { ok, refuse } from '@/modules/units';

const asking = vi.hoisted(() => ({ actor: null as unknown }));
vi.mock('@/app/_session', () => ({ currentActor: async () => asking.actor }));

const supervisor: Actor = {
  userId: 'usr_1',
  sessionId: 'ses_1',
  organisationId: 'org_1',
  organisationName: 'Test',
  name: 'Sue',
  email: 'sue@test.example',
  memberships: [{ role: 'supervisor', teamId: 'tea_1' }],
  personId: null,
};

const route = endpoint({
  need: 'floors.write',
  params: z.object({ floorId: z.string().startsWith('flr_') }),
  body: z.strictObject({ people: z.int().min(0, 'A floor cannot be below 0 people.') }),
  run: ({ body, params }) => {
    if (params.floorId === 'flr_bug') throw new Error('a bug');
    return params.floorId === 'flr_unknown'
      ? refuse('not-found', 'There is no such floor.')
      : ok(body);
  },
});

async function put(body: string, floorId = 'flr_1', headers: Record<string, string> = {}) {
  const request = new Request('http://localhost/api/v1/floors/x', {
    method: 'PUT',
    body,
    headers: { 'content-type': 'application/json', ...headers },
  });
  const response = await route(request, { params: Promise.resolve({ floorId }) });
  return { response, document: await response.json() };
}

beforeEach(() => {
  asking.actor = supervisor;
});

describe('a route', () => {
  it('answers a good request with the outcome, never to be cached', async () => {
    const { response, document } = await put('{"people":2}');
    expect(response.status).toBe(200);
    expect(response.headers.get('cache-control')).toBe('no-store');
    expect(document).toEqual({ people: 2 });
  });

  // The members and the media type of a problem document: RFC 9457, sections 3 and 3.1.
  it.each([
    [
      'without a session',
      () => {
        asking.actor = null;
      },
      '{"people":2}',
      'flr_1',
      401,
      'not-signed-in',
    ],
    [
      'of a role without the need',
      () => {
        asking.actor = { ...supervisor, memberships: [{ role: 'staff', teamId: 'tea_1' }] };
      },
      '{"people":2}',
      'flr_1',
      403,
      'not-allowed',
    ],
    ['with an id of another sort', () => {}, '{"people":2}', 'per_1', 404, 'not-found'],
    ['for an unknown row', () => {}, '{"people":2}', 'flr_unknown', 404, 'not-found'],
    ['with a wrong field', () => {}, '{"people":-1}', 'flr_1', 400, 'invalid'],
    ['with an unknown field', () => {}, '{"people":1,"x":1}', 'flr_1', 400, 'invalid'],
    ['that is not JSON', () => {}, '{people', 'flr_1', 400, 'invalid'],
    [
      'that is too large',
      () => {},
      JSON.stringify({ people: 'x'.repeat(largestBody) }),
      'flr_1',
      413,
      'too-large',
    ],
    ['that meets a bug', () => {}, '{"people":2}', 'flr_bug', 500, 'failed'],
  ])(
    'answers a request %s with a problem document',
    async (_, prepare, body, floorId, status, code) => {
      prepare();
      const { response, document } = await put(body, floorId);
      expect(response.status).toBe(status);
      expect(response.headers.get('content-type')).toBe('application/problem+json');
      expect(document).toMatchObject({
        type: 'about:blank',
        status,
        code,
        instance: '/api/v1/floors/x',
      });
      expect(document.title).toEqual(expect.any(String));
      expect(document.detail).toEqual(expect.any(String));
    },
  );

  it('names the field and the fix', async () => {
    const { document } = await put('{"people":-1}');
    expect(document.fields).toEqual([
      { path: 'people', message: 'A floor cannot be below 0 people.' },
    ]);
  });

  it('does not give away what broke', async () => {
    const { document } = await put('{"people":2}', 'flr_bug');
    expect(JSON.stringify(document)).not.toContain('a bug');
  });

  it('refuses a form post, which other sites could send', async () => {
    const { response } = await put('people=2', 'flr_1', {
      'content-type': 'application/x-www-form-urlencoded',
    });
    expect(response.status).toBe(415);
  });
});
