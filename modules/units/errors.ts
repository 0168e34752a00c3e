import { err, type Result } from './result';

/**
 * Every expected refusal of the product, in one table: its HTTP status (RFC 9110), the sentence a
 * person reads as the title, and how loudly the server log says it.
 */
export const errorTable = {
  invalid: { status: 400, title: 'Some fields need correcting', log: 'debug' },
  'not-signed-in': { status: 401, title: 'Sign in first', log: 'debug' },
  'not-allowed': { status: 403, title: 'Your role does not allow this', log: 'info' },
  'not-found': { status: 404, title: 'There is nothing here', log: 'debug' },
  conflict: { status: 409, title: 'This does not fit with what is already there', log: 'info' },
  'too-large': { status: 413, title: 'The request is too large', log: 'info' },
  'wrong-media-type': { status: 415, title: 'Send JSON', log: 'info' },
  'too-many': { status: 429, title: 'Too many tries, wait a little', log: 'warn' },
  failed: { status: 500, title: 'Something broke on our side', log: 'error' },
} as const;

export type ErrorCode = keyof typeof errorTable;

/** What is wrong with one field and how to mend it. `path` is dotted, e.g. `needs.3.people`. */
export interface FieldError {
  readonly path: string;
  readonly message: string;
}

/** An expected refusal: a code of the table, one sentence that says what to do, the fields it concerns. */
export interface AppError {
  readonly code: ErrorCode;
  readonly detail: string;
  readonly fields?: readonly FieldError[];
}

/** Refuses with a code and a sentence. */
export const refuse = (
  code: ErrorCode,
  detail: string,
  fields?: readonly FieldError[],
): Result<never, AppError> => err(fields ? { code, detail, fields } : { code, detail });

/** The outcome of a use-case. */
export type Outcome<T> = Result<T, AppError>;
