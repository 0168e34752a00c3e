import type { z } from 'zod';
import type { FieldError } from '../units';

/** One fault of a document as a sentence: what is not known by its name, anything else by its place. */
export function nameFault(document: unknown, issue: z.core.$ZodIssue): FieldError {
  const path = issue.path.join('.');
  return { path, message: nameUnknown(document, issue) ?? describe(path, issue) };
}

function nameUnknown(document: unknown, issue: z.core.$ZodIssue): string | null {
  const [part] = issue.path;
  const last = issue.path.at(-1);
  if (issue.code === 'unrecognized_keys' && last === 'rules') {
    return notKnown('rule', issue.keys[0]);
  }
  if (last === 'version') {
    return `Version ${valueAt(document, issue.path)} of the problem is not known to this version of the program; use a newer program.`;
  }
  if (last === 'kind' && part === 'teamRules') {
    return notKnown('team rule', valueAt(document, issue.path));
  }
  if (last === 'kind' && part === 'fairness') {
    return notKnown('fairness term', valueAt(document, issue.path));
  }
  return null;
}

const notKnown = (what: string, name: unknown): string =>
  `The ${what} ${String(name)} is not known to this version; remove it, or use a version that knows it.`;

function describe(path: string, issue: z.core.$ZodIssue): string {
  const place = path === '' ? 'The problem document' : path;
  if (issue.code === 'unrecognized_keys') {
    return `${place} holds ${issue.keys.join(', ')}, which nothing reads; remove it.`;
  }
  return `${place} does not fit: ${issue.message.replace(/\.$/, '')}. Correct it.`;
}

function valueAt(document: unknown, path: readonly PropertyKey[]): unknown {
  return path.reduce<unknown>(
    (value, key) =>
      typeof value === 'object' && value !== null ? Reflect.get(value, key) : undefined,
    document,
  );
}
