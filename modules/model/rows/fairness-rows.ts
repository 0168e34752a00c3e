import type { FairnessTerm, Problem } from '../../problem';
import type { ModelBuilder } from '../model-builder';
import type { PersonWork } from '../work-columns';
import { type Measure, measureOf } from './measures';
import type { WeekendColumn } from './weekend-rows';

/** A spread term: columns for the person with most and with least, and the rows that tie them. */
export interface SpreadRows {
  /** Position in problem.fairness. */
  readonly termIndex: number;
  readonly priceCents: number;
  readonly mostColumn: number;
  readonly leastColumn: number;
  readonly people: readonly (Measure & { readonly mostRow: number; readonly leastRow: number })[];
}

/** One step of a share term for one person: how much of the measure lies above the step. */
export interface ShareColumn extends Measure {
  readonly termIndex: number;
  readonly above: number;
  readonly priceCents: number;
  readonly column: number;
  readonly row: number;
}

export interface FairnessRows {
  readonly spreads: readonly SpreadRows[];
  readonly shares: readonly ShareColumn[];
}

/** Whether fairness prices the weekends of anybody. */
export const pricesWeekends = ({ fairness }: Problem): boolean =>
  fairness.some(({ measure }) => measure === 'weekends');

/**
 * Fairness among those who are no outside cover.
 *
 * spread: measure(person) <= most(term) and measure(person) >= least(term), rows most(term, person) and
 * least(term, person); the cost is priceCents x (most - least). Nothing with fewer than two people.
 * share: measure(person) - above <= share(term, person, step), rows and columns share(term, person, step);
 * each share column costs the priceCents of its step. Source: the exchange rates of the supervisor.
 */
export function addFairnessRows(
  builder: ModelBuilder,
  { fairness, people }: Problem,
  works: readonly PersonWork[],
  weekends: readonly (readonly WeekendColumn[])[],
): FairnessRows {
  const spreads: SpreadRows[] = [];
  const shares: ShareColumn[] = [];
  fairness.forEach((term, termIndex) => {
    const measures = works
      .filter(({ personIndex }) => people[personIndex]?.isOutside === false)
      .map((work) => measureOf(term.measure, work, weekends[work.personIndex] ?? []));
    if (term.kind === 'share') shares.push(...addShare(builder, term, termIndex, measures));
    else if (measures.length > 1) {
      spreads.push(addSpread(builder, term.priceCents, termIndex, measures));
    }
  });
  return { spreads, shares };
}

function addSpread(
  builder: ModelBuilder,
  priceCents: number,
  termIndex: number,
  measures: readonly Measure[],
): SpreadRows {
  const upper = Math.max(...measures.map(({ most }) => most));
  const mostColumn = builder.addColumn({
    name: `most(${termIndex})`,
    upper,
    costs: { cost: priceCents },
  });
  const leastColumn = builder.addColumn({
    name: `least(${termIndex})`,
    upper,
    costs: { cost: -priceCents },
  });
  const people = measures.map((measure) => {
    const place = `(${termIndex},p${measure.personIndex})`;
    const { constant, entries } = measure;
    const mostRow = builder.addRow({
      name: `most${place}`,
      upper: -constant,
      entries: [...entries, [mostColumn, -1]],
    });
    const leastRow = builder.addRow({
      name: `least${place}`,
      lower: -constant,
      entries: [...entries, [leastColumn, -1]],
    });
    return { ...measure, mostRow, leastRow };
  });
  return { termIndex, priceCents, mostColumn, leastColumn, people };
}

function addShare(
  builder: ModelBuilder,
  { steps }: Extract<FairnessTerm, { kind: 'share' }>,
  termIndex: number,
  measures: readonly Measure[],
): ShareColumn[] {
  return measures.flatMap((measure) =>
    steps.flatMap(({ above, priceCents }, index) => {
      if (measure.most <= above || priceCents === 0) return [];
      const name = `share(${termIndex},p${measure.personIndex},${index})`;
      const column = builder.addColumn({
        name,
        upper: measure.most - above,
        costs: { cost: priceCents },
      });
      const row = builder.addRow({
        name,
        upper: above - measure.constant,
        entries: [...measure.entries, [column, -1]],
      });
      return [{ ...measure, termIndex, above, priceCents, column, row }];
    }),
  );
}
