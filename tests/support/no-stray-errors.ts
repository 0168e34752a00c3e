import { afterEach, expect, vi } from 'vitest';

/** A console error that no test expects is a failure: nothing may go wrong silently. */
const errors = vi.spyOn(console, 'error');

afterEach(() => {
  const calls = errors.mock.calls.map((call) => call.map(String).join(' '));
  errors.mockClear();
  expect(calls, 'unexpected console.error').toEqual([]);
});
