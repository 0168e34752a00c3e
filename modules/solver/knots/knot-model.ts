import { buildRosterModel, type LinearModel, ModelBuilder } from '../../model';
import {
  everyMinute,
  type Problem,
  type Requirement,
  requirementKey,
  requirementsOf,
} from '../../problem';
import { barRows } from './bar-rows';
import { firmPart } from './firm-part';
import { type RowSketch, sketchRows } from './sketch-rows';

/** What one requirement adds to a bound of a row while it binds. */
export interface BoundPart {
  readonly requirement: number;
  readonly amount: number;
  /** Without any binding part in force the bound is none. */
  readonly isBinding: boolean;
}

/** A row that binds only through requirements. */
export interface KnotRow {
  readonly row: number;
  readonly lower: readonly BoundPart[];
  readonly upper: readonly BoundPart[];
}

/** A problem as a relaxation in which every requirement can be bent and switched off. */
export interface KnotModel {
  readonly requirements: readonly Requirement[];
  /** Objective `bent`: how far the rows are bent, in shifts or people. 0: the relaxation holds them all. */
  readonly linear: LinearModel;
  readonly rows: readonly KnotRow[];
}

/**
 * Builds the elastic relaxation: all rows of the compact model, those of requirements with a slack whose
 * sum is made least. What the compact model leaves out as columns (absences, Nights, rest at the borders) is
 * a row here, so that it can be switched off. Elastic programming: Chinneck and Dravnieks, ORSA J.
 * Computing 3, 1991, 157-168.
 */
export function buildKnotModel(problem: Problem): KnotModel {
  const requirements = requirementsOf(problem);
  const indexOf = new Map(requirements.map((one, index) => [requirementKey(one), index]));
  const open = openProblem(problem);
  const model = buildRosterModel(open);
  const sketches = [...sketchRows(problem, model), ...barRows(problem, model)];
  const builder = new ModelBuilder('Knots', { bent: 'minimise' });
  const { linear } = model;
  linear.columnNames.forEach((name, column) => {
    const isSlack = /^(short|excess|under|over)\(/.test(name);
    const upper = isSlack ? 0 : (linear.columnUpper[column] ?? 0);
    builder.addColumn({ name, lower: linear.columnLower[column] ?? 0, upper });
  });
  const rows = sketches.flatMap((sketch) => addSketch(builder, indexOf, sketch));
  return { requirements, linear: builder.build(), rows };
}

/** The firm part with everything that takes columns away taken out; it comes back as rows. */
function openProblem(problem: Problem): Problem {
  const firm = firmPart(problem);
  return {
    ...firm,
    people: firm.people.map((person) => ({
      ...person,
      absences: [],
      mayWorkNights: true,
      maximumMinutes: Math.max(person.maximumMinutes, everyMinute(problem, person)),
      kindLimits: [],
      // Times are moved out of reach of rest; days and Nights still count for runs.
      history: person.history.map((past) => ({
        ...past,
        startMinute: farBefore,
        endMinute: farBefore,
      })),
      following: person.following.map((next) => ({
        ...next,
        startMinute: farAfter,
        endMinute: farAfter,
      })),
    })),
  };
}

const farBefore = -10_000_000;
const farAfter = 10_000_000;

function addSketch(
  builder: ModelBuilder,
  indexOf: ReadonlyMap<string, number>,
  { name, entries, lower, upper }: RowSketch,
): KnotRow[] {
  const partsOf = (parts: RowSketch['lower']): BoundPart[] =>
    parts.flatMap(([requirement, amount, isBinding]) => {
      const index = indexOf.get(requirementKey(requirement));
      return index === undefined ? [] : [{ requirement: index, amount, isBinding }];
    });
  const parts = { lower: partsOf(lower), upper: partsOf(upper) };
  const isFixed = parts.lower.length + parts.upper.length === 0;
  const sum = (list: RowSketch['lower']) => list.reduce((total, [, amount]) => total + amount, 0);
  const bounds = {
    lower: lower.length === 0 ? Number.NEGATIVE_INFINITY : sum(lower),
    upper: upper.length === 0 ? Number.POSITIVE_INFINITY : sum(upper),
  };
  const weight = 1 / Math.max(1, ...entries.map(([, value]) => Math.abs(value)));
  const slack = (sign: 1 | -1) =>
    [builder.addColumn({ name: `bend(${name},${sign})`, costs: { bent: weight } }), sign] as const;
  const slacks = isFixed
    ? []
    : [...(lower.length > 0 ? [slack(1)] : []), ...(upper.length > 0 ? [slack(-1)] : [])];
  const row = builder.addRow({ name, ...bounds, entries: [...entries, ...slacks] });
  return isFixed ? [] : [{ row, ...parts }];
}
