import type { Problem, ProblemPerson } from '../../problem';
import type { PersonWork, WorkColumn } from '../work-columns';
import { buildNet } from './build-net';
import { groupKinds } from './kind-groups';
import type { Net } from './net';
import { type CountedMeasures, compileRules, type NetRules } from './net-rules';

/** A person's net and what they can choose on each of its arcs. */
export interface PersonLines {
  readonly person: ProblemPerson;
  readonly personIndex: number;
  readonly net: Net;
  /** Work columns by day x group count + group; pins leave out all others of their day. */
  readonly options: readonly (readonly WorkColumn[])[];
  /** By day: whether it may be a day off. */
  readonly mayBeFree: Uint8Array;
  /** Limits on kinds that the net does not count: most, and the groups of the kind. */
  readonly sideLimits: readonly { readonly most: number; readonly group: number }[];
}

/** Builds everybody's net; people with equal rules share one. */
export function buildPersonLines(problem: Problem, works: readonly PersonWork[]): PersonLines[] {
  const nets = new Map<string, Net>();
  const measures = countedMeasures(problem);
  return works.map(({ person, personIndex, columns, byDay }) => {
    const workable = new Set(columns.map(({ shift }) => shift.kindId));
    const groups = groupKinds(problem, person, workable);
    const rules = compileRules(problem, person, groups, measures);
    const key = keyOf(rules);
    const net = nets.get(key) ?? buildNet(rules);
    nets.set(key, net);
    const kept = byDay.map((works, day) => worksByPins(person, works, day));
    const counted = new Set(rules.counted.map(({ limit }) => limit));
    return {
      person,
      personIndex,
      net,
      options: kept.flatMap((works) => {
        const byGroup: WorkColumn[][] = Array.from({ length: groups.groupCount }, () => []);
        for (const work of works) byGroup[groups.groupOfShift[work.shift.index] ?? 0]?.push(work);
        return byGroup;
      }),
      mayBeFree: Uint8Array.from(problem.days, (_, day) =>
        person.pins.some((pin) => pin.dayIndex === day && pin.shiftIndex !== null) ? 0 : 1,
      ),
      sideLimits: [...groups.limitOf].flatMap((limit, group) => {
        const most = person.kindLimits[limit]?.most;
        return most === undefined || counted.has(limit) ? [] : [{ most, group }];
      }),
    };
  });
}

function worksByPins(
  { pins }: ProblemPerson,
  works: readonly WorkColumn[],
  day: number,
): readonly WorkColumn[] {
  return pins
    .filter(({ dayIndex }) => dayIndex === day)
    .reduce(
      (kept, pin) =>
        kept.filter(
          ({ shift, postSkillId }) =>
            shift.index === pin.shiftIndex && [null, postSkillId].includes(pin.postSkillId),
        ),
      works,
    );
}

/** Nights and weekends are counted in a net when something prices them. */
function countedMeasures({ fairness }: Problem): CountedMeasures {
  const measured = new Set(fairness.map(({ measure }) => measure));
  return { nights: measured.has('nights'), weekends: measured.has('weekends') };
}

/** Equal for people with the same net. */
function keyOf({ groups, ...rules }: NetRules): string {
  const { shiftOn, groupOfShift: _, ...arrays } = groups;
  const offered = Array.from(arrays.minutes, (_minutes, at) =>
    shiftOn(at % groups.groupCount, Math.floor(at / groups.groupCount)) ? 1 : 0,
  );
  return JSON.stringify([rules, arrays, offered], (_key, value: unknown) => {
    if (ArrayBuffer.isView(value)) return Array.from(value as Uint8Array).join();
    return value === Number.POSITIVE_INFINITY ? 'none' : value;
  });
}
