import { type LinearModel, ModelBuilder, type Objective } from '@/modules/model';

/** One row as printed in a textbook: coefficients by column, the sign, the right-hand side. */
type PlainRow = readonly [coefficients: readonly number[], sign: '<=' | '>=' | '=', side: number];

/** A published model with its published answer; null where the model has no solution. */
export interface PlainModel {
  readonly id: string;
  readonly source: string;
  readonly sense: Objective['sense'];
  readonly costs: readonly number[];
  readonly rows: readonly PlainRow[];
  readonly objective: number | null;
  /** The solution, where it is the only one. */
  readonly point?: readonly number[];
  /** Duals of the rows, where they are unique. */
  readonly duals?: readonly number[];
  /** Best value in whole numbers, where one is known. */
  readonly wholeObjective?: number;
  readonly wholePoint?: readonly number[];
}

const radiation = 'Hillier & Lieberman, Introduction to Operations Research, 3.4 and 4.6';
const bevco = 'Winston, Operations Research, 4.12 and 4.13 (Bevco)';

/** Section A4 of the check values: all of >=, =, <=, infeasible, degenerate, with duals. */
export const plainModels: readonly PlainModel[] = [
  {
    id: 'A4.1',
    source: `${radiation}: radiation therapy`,
    sense: 'minimise',
    costs: [0.4, 0.5],
    rows: [
      [[0.3, 0.1], '<=', 2.7],
      [[0.5, 0.5], '=', 6],
      [[0.6, 0.4], '>=', 6],
    ],
    objective: 5.25,
    point: [7.5, 4.5],
    duals: [-0.5, 1.1, 0],
    wholeObjective: 5.3,
    wholePoint: [7, 5],
  },
  {
    id: 'A4.2',
    source: `${radiation}: radiation therapy with 1.8 instead of 2.7`,
    sense: 'minimise',
    costs: [0.4, 0.5],
    rows: [
      [[0.3, 0.1], '<=', 1.8],
      [[0.5, 0.5], '=', 6],
      [[0.6, 0.4], '>=', 6],
    ],
    objective: null,
  },
  {
    id: 'A4.2, phase one',
    source: `${radiation}: least sum of artificial columns`,
    sense: 'minimise',
    costs: [0, 0, 1, 1],
    rows: [
      [[0.3, 0.1], '<=', 1.8],
      [[0.5, 0.5, 1], '=', 6],
      [[0.6, 0.4, 0, 1], '>=', 6],
    ],
    objective: 0.6,
    point: [3, 9, 0, 0.6],
  },
  {
    id: 'A4.3',
    source: bevco,
    sense: 'minimise',
    costs: [2, 3],
    rows: [
      [[0.5, 0.25], '<=', 4],
      [[1, 3], '>=', 20],
      [[1, 1], '=', 10],
    ],
    objective: 25,
    point: [5, 5],
    duals: [0, 0.5, 1.5],
  },
  {
    id: 'A4.4',
    source: `${bevco} with 36 instead of 20`,
    sense: 'minimise',
    costs: [2, 3],
    rows: [
      [[0.5, 0.25], '<=', 4],
      [[1, 3], '>=', 36],
      [[1, 1], '=', 10],
    ],
    objective: null,
  },
  {
    id: 'A4.4, phase one',
    source: `${bevco}: least sum of artificial columns`,
    sense: 'minimise',
    costs: [0, 0, 1, 1],
    rows: [
      [[0.5, 0.25], '<=', 4],
      [[1, 3, 1], '>=', 36],
      [[1, 1, 0, 1], '=', 10],
    ],
    objective: 6,
  },
  {
    id: 'A4.5',
    source: 'Hillier & Lieberman: Wyndor Glass',
    sense: 'maximise',
    costs: [3, 5],
    rows: [
      [[1, 0], '<=', 4],
      [[0, 2], '<=', 12],
      [[3, 2], '<=', 18],
    ],
    objective: 36,
    point: [2, 6],
    duals: [0, 1.5, 1],
  },
  {
    id: 'A4.6',
    source: 'Winston: Dakota Furniture',
    sense: 'maximise',
    costs: [60, 30, 20],
    rows: [
      [[8, 6, 1], '<=', 48],
      [[4, 2, 1.5], '<=', 20],
      [[2, 1.5, 0.5], '<=', 8],
      [[0, 1, 0], '<=', 5],
    ],
    objective: 280,
    point: [2, 0, 8],
    duals: [0, 10, 10, 0],
  },
  {
    id: 'A4.7',
    source: 'Chvátal, Linear Programming, 1983: cycling example',
    sense: 'maximise',
    costs: [10, -57, -9, -24],
    rows: [
      [[0.5, -5.5, -2.5, 9], '<=', 0],
      [[0.5, -1.5, -0.5, 1], '<=', 0],
      [[1, 0, 0, 0], '<=', 1],
    ],
    objective: 1,
    point: [1, 0, 1, 0],
    duals: [0, 18, 1],
  },
  {
    id: 'A4.8',
    source: 'Beale: cycling example',
    sense: 'maximise',
    costs: [0.75, -150, 0.02, -6],
    rows: [
      [[0.25, -60, -0.04, 9], '<=', 0],
      [[0.5, -90, -0.02, 3], '<=', 0],
      [[0, 0, 1, 0], '<=', 1],
    ],
    objective: 0.05,
    point: [0.04, 0, 1, 0],
    wholeObjective: 0.02,
  },
  {
    id: 'A4.9',
    source: 'Klee & Minty: n = 3',
    sense: 'maximise',
    costs: [100, 10, 1],
    rows: [
      [[1, 0, 0], '<=', 1],
      [[20, 1, 0], '<=', 100],
      [[200, 20, 1], '<=', 10_000],
    ],
    objective: 10_000,
    point: [0, 0, 10_000],
  },
];

/** The model with columns x0, x1 and so on, 0 or more. */
export function buildPlainModel(
  { id, sense, costs, rows }: PlainModel,
  isWhole = false,
): LinearModel {
  const builder = new ModelBuilder(id, { value: sense });
  for (const [index, value] of costs.entries()) {
    builder.addColumn({ name: `x${index}`, isInteger: isWhole, costs: { value } });
  }
  rows.forEach(([coefficients, sign, side], index) => {
    builder.addRow({
      name: `row${index}`,
      ...(sign === '<=' ? {} : { lower: side }),
      ...(sign === '>=' ? {} : { upper: side }),
      entries: coefficients.flatMap((value, column) =>
        value === 0 ? [] : [[column, value] as const],
      ),
    });
  });
  return builder.build();
}
