import { fork } from 'node:child_process';
import { join } from 'node:path';
import {
  blendObjective,
  buildRosterModel,
  levelWeight,
  type RosterModel,
  withLevelBlend,
  writeLp,
} from '@/modules/model';
import { proveRoster } from '@/modules/proof';
import { payFor } from '@/modules/units';
import { agreedObjective } from './agreed-objective';
import type { CaseResult, Judged, OwnResult } from './bench-result';
import type { CaseAnswer, CaseOrder } from './case-messages';
import type { BenchCase } from './cases';
import { boundFigureOf, figureOf, type Scale } from './figure';
import { type OutsideAnswer, type OutsideName, solveOutside } from './outside-run';

export const otherNames = ['highs', 'cbc', 'glpsol'] as const;
export type OtherName = (typeof otherNames)[number];

/** What every method is given in one run, so that figures can be compared. */
export interface Limits {
  readonly limitSeconds: number;
  readonly threads: number;
  readonly seed: number;
  readonly others: readonly OtherName[];
}

/** Runs the engine and the others on one case, one after the other. */
export async function runCase(bench: BenchCase, limits: Limits): Promise<CaseResult> {
  const { problem } = bench;
  const model = withLevelBlend(buildRosterModel(problem));
  const scale = scaleOf(model, bench.instance !== null);
  const own = (method: CaseOrder['method']) => runOwn(method, bench, { scale, limits });
  const outside = (name: OutsideName) => runOutside(name, model, { scale, limits });
  const isAsked = (name: OtherName) => limits.others.includes(name);
  return {
    name: bench.name,
    set: bench.set,
    people: problem.people.length,
    days: problem.days.length,
    kinds: new Set(problem.shifts.map(({ kindId }) => kindId)).size,
    bestKnown: bench.bestKnown,
    engine: await own('engine'),
    ...(isAsked('highs') ? { highs: await own('highs') } : {}),
    ...(isAsked('cbc') ? { cbc: await outside('cbc') } : {}),
    ...(isAsked('glpsol') ? { glpsol: await outside('glpsol') } : {}),
  };
}

interface Given {
  readonly scale: Scale;
  readonly limits: Limits;
}

function scaleOf({ problem, levels }: RosterModel, isWhole: boolean): Scale {
  if (levels.some(({ name }) => name !== 'shortage') || levels.length > 1) {
    throw new Error('The benchmark reads one level: the firm floors of one priority.');
  }
  return {
    fixedCents: problem.people
      .filter(({ paidBy }) => paidBy === 'contract')
      .reduce((sum, person) => sum + payFor(person.payCentsPerHour, person.contractMinutes), 0),
    missedMinuteCents: levels.length === 0 ? 0 : levelWeight(levels, 0),
    isWhole,
  };
}

async function runOwn(
  method: CaseOrder['method'],
  bench: BenchCase,
  { scale, limits }: Given,
): Promise<OwnResult> {
  const { limitSeconds, threads, seed } = limits;
  const order = { method, problem: bench.problem, scale, limitSeconds, seed };
  const { roster, costCents, ...figures } = await ask(order, threads);
  return { ...figures, ...judge(bench, scale, { roster, costCents }) };
}

/** Lets a process of its own do the work. */
function ask(order: CaseOrder, threads: number): Promise<CaseAnswer> {
  return new Promise((resolve) => {
    const environment = { ...process.env, SOLVER_THREADS: String(threads) };
    const child = fork(join('dist', 'bench', 'solve-case.mjs'), { env: environment });
    const fail = (failure: string) => resolve({ ...nothing, failure });
    child.once('message', (answer) => resolve(answer as CaseAnswer));
    child.once('error', (error) => fail(error.message));
    child.once('exit', (code) => fail(`ended with code ${code}`));
    child.send(order);
  });
}

const nothing: CaseAnswer = {
  roster: null,
  costCents: null,
  bound: null,
  seconds: 0,
  at: {},
  secondsToFirst: null,
  secondsToGap: {},
  peakMegabytes: null,
  failure: null,
};

/** What a roster is worth by the proof, and for open instances by the scorer too. Throws where they differ. */
function judge(
  { problem, instance, name }: BenchCase,
  scale: Scale,
  { roster, costCents }: Pick<CaseAnswer, 'roster' | 'costCents'>,
): Judged {
  if (!roster) return { objective: null, missedMinutes: null };
  const proof = proveRoster(problem, roster);
  const [breach] = proof.breaches;
  if (breach) throw new Error(`${name}: the roster is not lawful: ${breach.sentence}`);
  if (costCents !== null && costCents !== proof.costCents) {
    throw new Error(`${name}: cost ${costCents}, by the proof ${proof.costCents} cents.`);
  }
  if (instance) agreedObjective(instance, { roster, costCents: proof.costCents });
  const { shortageMinutes: missedMinutes } = proof;
  return { objective: figureOf(proof.costCents, missedMinutes, scale), missedMinutes };
}

async function runOutside(
  name: OutsideName,
  { linear }: RosterModel,
  { scale, limits }: Given,
): Promise<OutsideAnswer> {
  const answer = await solveOutside(name, writeLp(linear, blendObjective), limits);
  const figure = (cents: number | null) => figureOf(cents, 0, scale);
  return {
    ...answer,
    objective: figure(answer.objective),
    bound: boundFigureOf(answer.bound, 0, scale),
    at: Object.fromEntries(Object.entries(answer.at).map(([at, cents]) => [at, figure(cents)])),
  };
}
