import type { FieldError } from '@/modules/units';

/** A refusal of our API (RFC 9457), or a connection that failed. */
export class ApiProblem extends Error {
  readonly status: number;
  readonly title: string;
  readonly fields: readonly FieldError[];

  constructor(status: number, title: string, detail: string, fields: readonly FieldError[] = []) {
    super(detail);
    this.name = 'ApiProblem';
    this.status = status;
    this.title = title;
    this.fields = fields;
  }
}

/**
 * Calls `/api/v1/<path>` and returns its JSON. Throws an ApiProblem that says what happened and what to
 * do; status 0 means that the server was not reached.
 */
export async function callApi<T>(
  method: 'GET' | 'POST' | 'PUT' | 'PATCH' | 'DELETE',
  path: string,
  body?: unknown,
): Promise<T> {
  const response = await send(method, path, body);
  if (response.status === 204) return undefined as T;
  const answer = await response.json().catch(() => null);
  if (response.ok) return answer as T;
  throw new ApiProblem(
    response.status,
    answer?.title ?? 'The server gave no answer that can be read',
    answer?.detail ?? 'Nothing was changed. Try again in a moment.',
    answer?.fields,
  );
}

async function send(method: string, path: string, body: unknown): Promise<Response> {
  const init: RequestInit = { method };
  if (body !== undefined) {
    init.headers = { 'content-type': 'application/json' };
    init.body = JSON.stringify(body);
  }
  try {
    return await fetch(`/api/v1/${path}`, init);
  } catch {
    if (method === 'GET') throw new ApiProblem(0, 'Not read', 'The connection dropped. Try again.');
    const detail = 'The connection dropped. What you entered is kept here; try again.';
    throw new ApiProblem(0, 'Not saved', detail);
  }
}
