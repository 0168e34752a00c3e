import { readFileSync } from 'node:fs';
import { basename } from 'node:path';
import { CommandError, callersPath } from './command-line';
import type { Instance } from './instance';
import { readInstance } from './read-instance';

/** The instance in a file, whose path is the caller's. */
export function loadInstance(path: string): Instance {
  const file = callersPath(path);
  let text: string;
  try {
    text = readFileSync(file, 'utf8');
  } catch {
    throw new CommandError(`The file ${file} cannot be read.`);
  }
  return readInstance(text, basename(file));
}
