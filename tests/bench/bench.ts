import { mkdirSync, writeFileSync } from 'node:fs';
import { availableParallelism, cpus } from 'node:os';
import { dirname, join } from 'node:path';
import type { CaseResult } from './bench-result';
import { type BenchCase, casesOf, type SetName, setNames } from './cases';
import {
  CommandError,
  callersPath,
  numberOption,
  type Options,
  readOptions,
  secondsOption,
  seedOption,
  threadsOption,
} from './command-line';
import { fittedExponent } from './growth';
import { type Limits, type OtherName, otherNames, runCase } from './run-case';
import { headings, legend, rowOf } from './table';

const resultFile = join('test-results', 'bench.json');
const quickSeconds = 10;
const names = ['set', 'only', 'against', 'seconds', 'threads', 'seed', 'data'];

/**
 * Runs the sets case by case, each with the engine and the others in turn, prints a row as soon as a case
 * is done and keeps everything in test-results/bench.json.
 */
export async function main(args: readonly string[]): Promise<void> {
  const options = readOptions(args, names, ['quick']);
  const limits = limitsOf(options);
  const cases = chooseCases(options);
  if (cases.length === 0) throw new CommandError('No case is left to run.');
  const results: CaseResult[] = [];
  for (const line of [...legend, limitWords(limits), '', headings()]) say(line);
  for (const bench of cases) {
    const result = await runCase(bench, limits);
    results.push(result);
    say(rowOf(result));
    tellFailures(result);
    write(results, limits);
  }
  for (const line of growthWords(results)) say(line);
  say(`Everything is in ${resultFile}.`);
}

function limitsOf(options: Options): Limits {
  const standard = options.quick ? quickSeconds : secondsOption.standard;
  const against = listOption(options, 'against', [...otherNames, 'none'] as const) ?? otherNames;
  return {
    limitSeconds: numberOption(options, 'seconds', { ...secondsOption, standard }),
    threads: numberOption(options, 'threads', threadsOption),
    seed: numberOption(options, 'seed', seedOption),
    others: against.filter((name): name is OtherName => name !== 'none'),
  };
}

function chooseCases(options: Options): BenchCase[] {
  const given = options.data ?? process.env.BENCH_DATA;
  const all = casesOf({
    sets: listOption<SetName>(options, 'set', setNames) ?? setNames,
    dataFolder: given ? callersPath(given) : join(process.cwd(), '..', 'shared', 'data'),
    isQuick: options.quick !== undefined,
    tell: say,
  });
  const only = listOption(
    options,
    'only',
    all.map(({ name }) => name),
  );
  return only ? all.filter(({ name }) => only.includes(name)) : all;
}

/** A list like `demo,open`; null when it is not given. */
function listOption<T extends string>(
  options: Options,
  name: string,
  choices: readonly T[],
): T[] | null {
  const text = options[name];
  if (text === undefined) return null;
  return text.split(',').map((part) => {
    const choice = choices.find((one) => one === part.trim());
    if (choice) return choice;
    throw new CommandError(`--${name} has "${part}"; it may have ${choices.join(', ')}.`);
  });
}

function tellFailures({ name, engine, highs, cbc, glpsol }: CaseResult): void {
  for (const [method, answer] of Object.entries({ engine, highs, cbc, glpsol })) {
    if (answer?.failure) say(`  ${name}, ${method}: ${answer.failure}`);
  }
}

function write(results: readonly CaseResult[], { limitSeconds, threads, seed }: Limits): void {
  const machine = {
    processor: cpus()[0]?.model ?? 'unknown',
    cores: availableParallelism(),
    node: process.version,
  };
  const content = {
    endedAt: new Date().toISOString(),
    limitSeconds,
    threads,
    seed,
    machine,
    growthExponent: fittedExponent(growthPoints(results)),
    cases: results,
  };
  mkdirSync(dirname(resultFile), { recursive: true });
  writeFileSync(resultFile, `${JSON.stringify(content, null, 2)}\n`);
}

const growthPoints = (results: readonly CaseResult[]) =>
  results.flatMap(({ set, people, engine }) => {
    const seconds = engine.secondsToGap['0.01'];
    return set === 'sizes' && seconds ? [{ people, seconds }] : [];
  });

function growthWords(results: readonly CaseResult[]): string[] {
  const sizes = results.filter(({ set }) => set === 'sizes');
  if (sizes.length === 0) return [];
  const points = growthPoints(results);
  const exponent = fittedExponent(points);
  const times = points.map(({ people, seconds }) => `${people}: ${seconds.toFixed(1)} s`);
  const late = sizes.filter(({ people }) => !points.some((point) => point.people === people));
  return [
    `Time to a 1 % gap by people: ${times.join(', ') || 'never reached'}.`,
    ...(exponent === null ? [] : [`It grows with people to the power of ${exponent.toFixed(2)}.`]),
    ...(late.length === 0
      ? []
      : [`Not reached within the limit: ${late.map(({ people }) => people).join(', ')}.`]),
  ];
}

const limitWords = ({ limitSeconds, threads, seed }: Limits): string =>
  `${limitSeconds} s each, ${threads} threads for the engine and CBC, seed ${seed}.`;

function say(line: string): void {
  process.stdout.write(`${line}\n`);
}
