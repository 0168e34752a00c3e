import { resolve } from 'node:path';
import { parseArgs } from 'node:util';

/** Why a command cannot do what it was asked; the message is a sentence for whoever called it. */
export class CommandError extends Error {
  override readonly name = 'CommandError';
}

/** Options by name, as text; a flag that is given is 'yes'. */
export type Options = Readonly<Record<string, string | undefined>>;

/** Reads `--name value`, `--name=value` and flags. Refuses everything else in one sentence. */
export function readOptions(
  args: readonly string[],
  names: readonly string[],
  flags: readonly string[] = [],
): Options {
  const known = [...names, ...flags];
  const { tokens } = parseArgs({
    args: [...args],
    options: Object.fromEntries([
      ...names.map((name) => [name, { type: 'string' as const }] as const),
      ...flags.map((name) => [name, { type: 'boolean' as const }] as const),
    ]),
    strict: false,
    tokens: true,
  });
  const options: Record<string, string> = {};
  const choices = known.map((name) => `--${name}`).join(', ');
  for (const token of tokens) {
    if (token.kind !== 'option') {
      const text = token.kind === 'positional' ? token.value : '--';
      throw new CommandError(`"${text}" is no option; the options are ${choices}.`);
    }
    if (!known.includes(token.name)) {
      throw new CommandError(`${token.rawName} is unknown; the options are ${choices}.`);
    }
    const isFlag = flags.includes(token.name);
    if (isFlag && token.value !== undefined)
      throw new CommandError(`--${token.name} takes no value.`);
    if (!isFlag && !token.value) throw new CommandError(`--${token.name} needs a value.`);
    options[token.name] = token.value ?? 'yes';
  }
  return options;
}

/** A number of an option within limits, or what stands for it when it is not given. */
export function numberOption(
  options: Options,
  name: string,
  { standard, least, most, isWhole }: NumberOption,
): number {
  const text = options[name];
  if (text === undefined) return standard;
  const value = /^\d+(\.\d+)?$/.test(text) ? Number(text) : Number.NaN;
  if (value >= least && value <= most && (!isWhole || Number.isInteger(value))) return value;
  const kind = isWhole ? 'a whole number' : 'a number';
  throw new CommandError(`--${name} is "${text}"; it must be ${kind} from ${least} to ${most}.`);
}

export interface NumberOption {
  readonly standard: number;
  readonly least: number;
  readonly most: number;
  readonly isWhole: boolean;
}

export const secondsOption: NumberOption = { standard: 60, least: 1, most: 3600, isWhole: false };
export const threadsOption: NumberOption = { standard: 2, least: 1, most: 16, isWhole: true };
export const seedOption: NumberOption = { standard: 1, least: 0, most: 999_999_999, isWhole: true };

/** A path as the caller meant it: npm runs scripts in the project's folder, wherever it was called. */
export const callersPath = (path: string): string =>
  resolve(process.env.INIT_CWD ?? process.cwd(), path);
