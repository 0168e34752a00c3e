/** The outcome of something that can fail in an expected way. Bugs throw; expected refusals return. */
export type Result<T, E> =
  | { readonly ok: true; readonly value: T }
  | { readonly ok: false; readonly error: E };

/** Wraps a success. `ok(3)` is `{ ok: true, value: 3 }`. */
export const ok = <T>(value: T): { readonly ok: true; readonly value: T } => ({ ok: true, value });

/** Wraps an expected refusal. */
export const err = <E>(error: E): { readonly ok: false; readonly error: E } => ({
  ok: false,
  error,
});

/** Ends a `switch` over a union: the compiler refuses a forgotten case, the run names it. */
export function assertNever(value: never): never {
  throw new Error(`Unexpected case: ${JSON.stringify(value)}`);
}
