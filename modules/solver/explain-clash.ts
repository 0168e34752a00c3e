import {
  buildRosterModel,
  findObstacle,
  type LinearModel,
  type Obstacle,
  type RosterModel,
} from '../model';
import type { Problem, ProblemPerson } from '../problem';
import { assertNever, formatHours } from '../units';
import type { LinearSolver } from './linear-solver';

/** A clash of one person's rules is small: this is far more than it takes. */
const limitSeconds = 5;

/**
 * One sentence on why a person has no lawful line of shifts: a pinned shift they cannot work, pins that
 * break rules together, or contract hours that cannot be met. `problem` holds this person alone.
 */
export function explainClash(solve: LinearSolver, problem: Problem, person: ProblemPerson): string {
  const blocked = explainBlockedPin(problem, person);
  if (blocked) return blocked;
  const free = { ...person, minimumMinutes: 0, maximumMinutes: Number.MAX_SAFE_INTEGER };
  const model = buildRosterModel({ ...problem, people: [free] });
  const least = findWorked(solve, model, 'minimise');
  const most = findWorked(solve, model, 'maximise');
  if (least === null || most === null) {
    return `The pins of ${person.name} cannot all be kept: together they break a rule on rest, days or Nights in a row, Nights or weekends; move or remove one of them.`;
  }
  return explainHours(person, least + person.creditMinutes, most + person.creditMinutes);
}

function explainBlockedPin(problem: Problem, person: ProblemPerson): string | null {
  for (const pin of person.pins) {
    const shift = problem.shifts.find(({ index }) => index === pin.shiftIndex);
    const obstacle = shift ? findObstacle(problem, person, shift) : null;
    if (shift && obstacle) {
      const date = problem.days[shift.dayIndex]?.date;
      return `${person.name} is pinned to ${shift.kindName} on ${date} but ${describe(obstacle)}; move or remove the pin.`;
    }
  }
  return null;
}

function describe(obstacle: Obstacle): string {
  switch (obstacle.kind) {
    case 'absent':
      return `is away then (${obstacle.reason})`;
    case 'no-nights':
      return 'works no Nights by contract';
    case 'no-skill':
      return 'holds no skill that this shift kind takes';
    case 'kind-limit':
      return 'may work no shift of this kind';
    case 'rest-after-history':
      return 'has too little rest after the last shift before the period';
    case 'rest-before-following':
      return 'has too little rest before the first shift after the period';
    default:
      return assertNever(obstacle);
  }
}

/** Least or most paid minutes the person can work with all other rules kept; null when they clash too. */
function findWorked(
  solve: LinearSolver,
  model: RosterModel,
  sense: 'minimise' | 'maximise',
): number | null {
  const costs = new Float64Array(model.linear.columnNames.length);
  for (const { column, shift } of model.works.flatMap(({ columns }) => columns)) {
    costs[column] = shift.paidMinutes;
  }
  const linear: LinearModel = {
    ...model.linear,
    objectives: { worked: { sense, offset: 0, costs } },
  };
  const outcome = solve(linear, 'worked', { limitSeconds });
  return outcome.kind === 'optimal' ? Math.round(outcome.solution.objective) : null;
}

function explainHours(person: ProblemPerson, least: number, most: number): string {
  const { name, minimumMinutes, maximumMinutes, creditMinutes } = person;
  const leave = creditMinutes > 0 ? `, ${formatHours(creditMinutes)} h of leave included` : '';
  if (most < minimumMinutes) {
    return `${name} can reach at most ${formatHours(most)} h${leave}, but the contract asks for at least ${formatHours(minimumMinutes)} h; allow fewer hours in the contract, credit more leave or relax a rule.`;
  }
  if (least > maximumMinutes) {
    return `${name} has at least ${formatHours(least)} h by leave and pins, but the contract allows at most ${formatHours(maximumMinutes)} h; remove a pin or allow more hours in the contract.`;
  }
  return `No choice of shifts gives ${name} between ${formatHours(minimumMinutes)} h and ${formatHours(maximumMinutes)} h${leave}; allow a wider range of hours in the contract.`;
}
