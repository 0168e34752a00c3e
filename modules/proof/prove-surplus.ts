import type { Problem, ProblemCeiling } from '../problem';
import { coverOf } from './cover';
import type { Duty } from './duties';
import { at, countByMinute } from './minute-counts';
import type { ProvenSurplus } from './proof';
import { quotientHalfUp } from './quotient';
import { findStretches, personMinutes, type Stretch } from './stretches';
import { dateOfDay } from './words';

/** Where more people are on duty than ceilings take, and what the priced ones of them cost. */
export interface SurplusFinding {
  readonly surpluses: readonly ProvenSurplus[];
  readonly surplusMinutes: number;
  readonly pricedSurplusMinutes: number;
  readonly pricedSurplusCents: number;
}

interface Excess extends Stretch {
  readonly ceiling: ProblemCeiling;
}

/** Holds cover against the ceilings minute by minute; each stands alone. */
export function proveSurplus(problem: Problem, duties: readonly Duty[]): SurplusFinding {
  const excesses = problem.ceilings
    .flatMap((ceiling): Excess[] => {
      const have = countByMinute(ceiling, coverOf(duties, ceiling));
      return findStretches(ceiling, (minute) =>
        Math.max(0, at(have, minute - ceiling.startMinute) - ceiling.people),
      ).map((stretch) => ({ ...stretch, ceiling }));
    })
    .sort((one, other) => one.startMinute - other.startMinute);
  const priced = excesses.filter(({ ceiling }) => ceiling.priceCentsPerHour !== null);
  return {
    surpluses: excesses.map((excess) => describe(problem, excess)),
    surplusMinutes: personMinutes(
      excesses.filter(({ ceiling }) => ceiling.priceCentsPerHour === null),
    ),
    pricedSurplusMinutes: personMinutes(priced),
    pricedSurplusCents: priced.reduce((sum, excess) => sum + costOf(excess), 0),
  };
}

/** Person-minutes too many times the price of an hour, rounded once per stretch. */
const costOf = (excess: Excess): number =>
  quotientHalfUp(
    BigInt(personMinutes([excess])) * BigInt(excess.ceiling.priceCentsPerHour ?? 0),
    60n,
  );

const describe = (
  problem: Problem,
  { ceiling, startMinute, endMinute, people }: Excess,
): ProvenSurplus => ({
  ceilingId: ceiling.ceilingId,
  skillId: ceiling.skillId,
  date: dateOfDay(problem, ceiling.dayIndex),
  startMinute,
  endMinute,
  surplusPeople: people,
  isFirm: ceiling.priceCentsPerHour === null,
});
