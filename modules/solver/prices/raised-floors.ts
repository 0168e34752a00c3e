import { buildRosterModel, type RosterModel } from '../../model';
import type { Problem, ProblemFloor } from '../../problem';
import type { PriceQuestion } from './floor-price';

/** A model whose asked floors have room for more people, and what its rows ask for today. */
export interface RaisedModel {
  readonly model: RosterModel;
  /** Rows of a question, with today's people and how many of its floors ask there. */
  readonly rowsOf: (question: PriceQuestion) => readonly RaisedRow[];
  readonly rows: readonly RaisedRow[];
}

export interface RaisedRow {
  readonly row: number;
  readonly people: number;
  readonly floors: number;
}

/**
 * Builds the model with every asked floor raised by `most`, so that its missing people have columns enough,
 * and answers how to set the rows back. Only what is firm can be raised so: where missing people have a
 * price, columns beyond the need would be used.
 */
export function raiseFloors(
  problem: Problem,
  questions: readonly PriceQuestion[],
  most: number,
): RaisedModel {
  const isAsked = (floor: ProblemFloor): boolean =>
    floor.priceCentsPerHour === null && questions.some((question) => asks(question, floor));
  const floors = problem.floors.map((floor) =>
    isAsked(floor) ? { ...floor, people: floor.people + most } : floor,
  );
  const model = buildRosterModel({ ...problem, floors });
  const firmIn = (row: RosterModel['floors'][number]): readonly ProblemFloor[] =>
    row.floors.filter(isAsked);
  const rowOf = (row: RosterModel['floors'][number], asked: number): RaisedRow => ({
    row: row.row,
    people: row.people - most * firmIn(row).length,
    floors: asked,
  });
  return {
    model,
    rows: model.floors
      .filter((row) => firmIn(row).length > 0)
      .map((row) => rowOf(row, firmIn(row).length)),
    rowsOf: (question) =>
      model.floors.flatMap((row) => {
        const asked = firmIn(row).filter((floor) => asks(question, floor)).length;
        return asked === 0 ? [] : [rowOf(row, asked)];
      }),
  };
}

const asks = ({ floorId, dayIndex }: PriceQuestion, floor: ProblemFloor): boolean =>
  floor.floorId === floorId && (dayIndex === null || floor.dayIndex === dayIndex);
