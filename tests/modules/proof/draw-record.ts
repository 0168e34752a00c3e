import type { BoundRecord, Problem } from '@/modules/problem';

/** Figures from a list, in turn, as multipliers of any size. */
export interface Draw {
  readonly next: () => number;
  readonly isLeftOut: () => boolean;
}

export function drawFrom(figures: readonly number[]): Draw {
  let at = 0;
  const next = () => figures[at++ % figures.length] ?? 0;
  return { next, isLeftOut: () => next() < 0.15 };
}

/** A record that fits the problem, with multipliers as drawn; some rows are left out. */
export function recordOf(problem: Problem, draw: Draw): BoundRecord {
  const firm = problem.floors.filter(({ priceCentsPerHour }) => priceCentsPerHour === null);
  const hasFirmCeiling = problem.ceilings.some((one) => one.priceCentsPerHour === null);
  return {
    shortage: [...new Set(firm.map(({ priority }) => priority))].map((priority) => ({
      priority,
      centsPerMinute: draw.next() * 60,
    })),
    surplusCentsPerMinute: hasFirmCeiling ? draw.next() * 30 : 0,
    slices: slicesOf(problem, draw),
    teamRules: problem.teamRules
      .flatMap((rule) => placesOf(problem, rule).map((at) => ({ ruleId: rule.id, at })))
      .filter(() => !draw.isLeftOut())
      .map((row) => ({
        ...row,
        cents: (draw.next() - 0.5) * (row.ruleId === 'budget' ? 3 : 3000),
      })),
    spreads: problem.fairness.flatMap((term, index) =>
      term.kind === 'spread' ? spreadOf(problem, index, term.priceCents, draw) : [],
    ),
  };
}

function spreadOf(problem: Problem, term: number, priceCents: number, draw: Draw) {
  const insiders = problem.people.filter(({ isOutside }) => !isOutside);
  return insiders.map(({ id }) => ({
    term,
    personId: id,
    mostCents: (draw.next() * priceCents) / insiders.length,
    leastCents: (draw.next() * priceCents) / insiders.length,
  }));
}

function placesOf({ shifts, days }: Problem, rule: Problem['teamRules'][number]) {
  if (rule.kind === 'together') return shifts.map(({ index }) => index);
  if (rule.kind === 'apart') return [...new Set(shifts.map(({ startMinute }) => startMinute))];
  if (rule.kind === 'mostFree') return [...days.keys()];
  return [null];
}

/** The time of every floor and ceiling, cut where shifts start or end and where windows do. */
function slicesOf(problem: Problem, draw: Draw): BoundRecord['slices'] {
  const windows = [
    ...problem.floors
      .filter(({ people }) => people > 0)
      .map((floor) => ({
        ...floor,
        of: floor.counting,
        id: floor.counting === 'seated' ? null : floor.floorId,
      })),
    ...problem.ceilings.map((one) => ({ ...one, of: 'ceiling' as const, id: one.ceilingId })),
  ];
  const cuts = [
    ...new Set([...problem.shifts, ...windows].flatMap((one) => [one.startMinute, one.endMinute])),
  ];
  cuts.sort((one, other) => one - other);
  const slices = new Map<string, BoundRecord['slices'][number]>();
  for (const { of, id, skillId: skill, ...own } of windows) {
    cuts.slice(1).forEach((endMinute, index) => {
      const startMinute = cuts[index] ?? endMinute;
      if (startMinute < own.startMinute || own.endMinute < endMinute || draw.isLeftOut()) return;
      const cents = (draw.next() - 0.3) * (endMinute - startMinute) * 40;
      slices.set(`${of} ${id} ${skill} ${startMinute}`, {
        of,
        id,
        skillId: skill,
        startMinute,
        endMinute,
        cents,
      });
    });
  }
  return [...slices.values()];
}

/** Other multipliers nearby: some go up, some down, some to 0. */
export function shake(record: BoundRecord, draw: Draw): BoundRecord {
  const move = (size: number) => (cents: number) => {
    const luck = draw.next();
    if (luck < 0.6) return cents;
    return luck < 0.65 ? 0 : cents + (draw.next() - 0.5) * size;
  };
  const moveUp = (size: number) => (cents: number) => Math.max(0, move(size)(cents));
  return {
    shortage: record.shortage.map((one) => ({
      ...one,
      centsPerMinute: moveUp(100)(one.centsPerMinute),
    })),
    surplusCentsPerMinute: record.surplusCentsPerMinute && moveUp(50)(record.surplusCentsPerMinute),
    slices: record.slices.map((one) => ({ ...one, cents: move(8000)(one.cents) })),
    teamRules: record.teamRules.map((one) => ({
      ...one,
      cents: move(one.ruleId === 'budget' ? 1 : 3000)(one.cents),
    })),
    spreads: record.spreads.map((one) => ({
      ...one,
      mostCents: one.mostCents * (0.5 + draw.next()),
      leastCents: one.leastCents * (0.5 + draw.next()),
    })),
  };
}
