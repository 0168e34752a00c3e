import type { z } from 'zod';
import { log } from '@/db/log';
import { type Actor, can, type Need } from '@/modules/access';
import {
  type AppError,
  errorTable,
  type FieldError,
  type Outcome,
  ok,
  type Result,
  refuse,
} from '@/modules/units';
import { currentActor } from './_session';

/** Largest request body in bytes: a whole team's floors fit many times over. */
export const largestBody = 1_000_000;

interface Input<P, Q, B> {
  readonly actor: Actor;
  readonly params: P;
  readonly query: Q;
  readonly body: B;
  readonly request: Request;
}

interface Endpoint<P, Q, B, T> {
  readonly need: Need;
  readonly params?: z.ZodType<P>;
  readonly query?: z.ZodType<Q>;
  /** Given: the request must carry JSON of this shape. */
  readonly body?: z.ZodType<B>;
  /** Status of a success that has content; 204 is used for `ok(undefined)`. */
  readonly status?: 200 | 201;
  readonly run: (input: Input<P, Q, B>) => Outcome<T> | Response | Promise<Outcome<T> | Response>;
}

type Handler = (
  request: Request,
  context: { params: Promise<Record<string, string | string[] | undefined>> },
) => Promise<Response>;

/**
 * Makes a route handler: session, permission, validation, use-case, answer. Refusals leave as problem
 * documents (RFC 9457); what broke unexpectedly is logged with its cause and answered without detail.
 */
export function endpoint<P = unknown, Q = unknown, B = undefined, T = unknown>(
  spec: Endpoint<P, Q, B, T>,
): Handler {
  return async (request, context) => {
    try {
      const outcome = await answer(spec, request, await context.params);
      if (outcome instanceof Response) return outcome;
      if (!outcome.ok) return problemResponse(outcome.error, request);
      if (outcome.value === undefined) return new Response(null, { status: 204 });
      return Response.json(outcome.value, {
        status: spec.status ?? 200,
        headers: { 'cache-control': 'no-store' },
      });
    } catch (cause) {
      log().error({ err: cause, path: new URL(request.url).pathname }, 'request failed');
      const detail = 'Nothing was changed. Try again; if it stays, tell whoever runs this server.';
      return problemResponse({ code: 'failed', detail }, request);
    }
  };
}

async function answer<P, Q, B, T>(
  spec: Endpoint<P, Q, B, T>,
  request: Request,
  rawParams: unknown,
): Promise<Outcome<T> | Response> {
  const actor = await currentActor();
  if (!actor) return refuse('not-signed-in', 'Your session has ended. Sign in and try again.');
  if (!can(actor, spec.need)) return refuse('not-allowed', 'Ask an owner if you need this.');
  const params = parse(spec.params, rawParams);
  if (!params.ok) return refuse('not-found', 'There is nothing under this address.');
  const query = parse(spec.query, Object.fromEntries(new URL(request.url).searchParams));
  if (!query.ok) return query;
  const body = spec.body ? await readBody(spec.body, request) : ok(undefined as B);
  if (!body.ok) return body;
  return spec.run({ actor, params: params.value, query: query.value, body: body.value, request });
}

/** Turns zod's findings into our field errors: dotted path and a sentence. */
export function fieldErrors(error: z.ZodError): FieldError[] {
  return error.issues.map((issue) => ({ path: issue.path.join('.'), message: issue.message }));
}

function parse<T>(schema: z.ZodType<T> | undefined, value: unknown): Result<T, AppError> {
  if (!schema) return ok(value as T);
  const outcome = schema.safeParse(value);
  if (outcome.success) return ok(outcome.data);
  const fields = fieldErrors(outcome.error);
  const names = fields.map(({ path, message }) => (path ? `${path}: ${message}` : message));
  return refuse('invalid', names.join(' '), fields);
}

async function readBody<B>(schema: z.ZodType<B>, request: Request): Promise<Outcome<B>> {
  const type = request.headers.get('content-type') ?? '';
  if (!type.startsWith('application/json')) {
    return refuse('wrong-media-type', 'Set the header Content-Type to application/json.');
  }
  const tooLarge = refuse(
    'too-large',
    `Send at most ${largestBody.toLocaleString('en-GB')} bytes.`,
  );
  if (Number(request.headers.get('content-length') ?? 0) > largestBody) return tooLarge;
  const text = await readAtMost(request, largestBody);
  if (text === null) return tooLarge;
  try {
    return parse(schema, JSON.parse(text));
  } catch {
    return refuse('invalid', 'The body is not JSON that can be read.');
  }
}

/** Reads a body as UTF-8, giving up (null) once it is larger than promised. */
async function readAtMost(request: Request, limit: number): Promise<string | null> {
  const reader = request.body?.getReader();
  if (!reader) return '';
  const chunks: Uint8Array[] = [];
  let size = 0;
  for (;;) {
    const { done, value } = await reader.read();
    if (done) return Buffer.concat(chunks).toString('utf8');
    size += value.byteLength;
    if (size > limit) {
      await reader.cancel();
      return null;
    }
    chunks.push(value);
  }
}

/** A problem document (RFC 9457) for an expected refusal. */
export function problemResponse(error: AppError, request: Request): Response {
  const { status, title } = errorTable[error.code];
  const document = {
    type: 'about:blank',
    title,
    status,
    detail: error.detail,
    instance: new URL(request.url).pathname,
    code: error.code,
    ...(error.fields ? { fields: error.fields } : {}),
  };
  return new Response(JSON.stringify(document), {
    status,
    headers: { 'content-type': 'application/problem+json', 'cache-control': 'no-store' },
  });
}
