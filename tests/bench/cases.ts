import { existsSync } from 'node:fs';
import { join } from 'node:path';
import type { Problem } from '@/modules/problem';
import { problemOf } from './adapt-instance';
import { bestKnown } from './best-known';
import { demoProblem } from './demo-problem';
import type { Instance } from './instance';
import { loadInstance } from './load-instance';
import { makeTeam } from './make-team';

export const setNames = ['demo', 'open', 'sizes'] as const;
export type SetName = (typeof setNames)[number];

/** One problem of the benchmark. */
export interface BenchCase {
  readonly name: string;
  readonly set: SetName;
  readonly problem: Problem;
  /** Of open instances: the file's own words, and the best objective anybody has published. */
  readonly instance: Instance | null;
  readonly bestKnown: number | null;
}

interface Choice {
  readonly sets: readonly SetName[];
  readonly dataFolder: string;
  /** A few small ones only. */
  readonly isQuick: boolean;
  readonly tell: (sentence: string) => void;
}

const quickInstances = [1, 2, 3, 5, 8];
const sizes = [10, 20, 40, 80, 160];
const quickSizes = [10, 20, 40];
const teamSeed = 1;

/** The cases of the sets, in the order in which they run; a missing instance is told and left out. */
export function casesOf({ sets, dataFolder, isQuick, tell }: Choice): BenchCase[] {
  const casesIn: Record<SetName, () => BenchCase[]> = {
    demo: () => [ownCase('demo', 'demo', demoProblem())],
    open: () => {
      const numbers = isQuick ? quickInstances : [...bestKnown.keys()];
      if (existsSync(dataFolder)) return numbers.flatMap((one) => openCase(one, dataFolder, tell));
      tell(`The folder ${dataFolder} is not there, so the open instances are left out.`);
      return [];
    },
    sizes: () =>
      (isQuick ? quickSizes : sizes).map((size) =>
        ownCase(`team ${size}`, 'sizes', makeTeam(size, teamSeed)),
      ),
  };
  return sets.flatMap((set) => casesIn[set]());
}

function openCase(
  number: number,
  dataFolder: string,
  tell: (sentence: string) => void,
): BenchCase[] {
  const file = join(dataFolder, `Instance${number}.txt`);
  if (!existsSync(file)) {
    tell(`${file} is not there, so open instance ${number} is left out.`);
    return [];
  }
  const instance = loadInstance(file);
  const known = bestKnown.get(number) ?? null;
  const problem = problemOf(instance);
  return [{ name: `open ${number}`, set: 'open', problem, instance, bestKnown: known }];
}

const ownCase = (name: string, set: SetName, problem: Problem): BenchCase => ({
  name,
  set,
  problem,
  instance: null,
  bestKnown: null,
});
