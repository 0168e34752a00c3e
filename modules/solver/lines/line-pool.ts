import { costOf } from './line-cost';
import type { Pattern } from './pattern-master';
import type { RosterLines } from './roster-lines';

/** Newest lines kept of each person. */
const linesAPerson = 24;
/** Lines of a person beyond which none is added from elsewhere. */
const mostLinesAPerson = 80;

/** The newest different lines of each person that a search has gone through. */
export class LinePool {
  readonly #byPerson: Map<string, Pattern>[];

  constructor(people: number) {
    this.#byPerson = Array.from({ length: people }, () => new Map());
  }

  /** Takes the lines of everybody who is in; the oldest go. */
  take(roster: RosterLines): void {
    this.#byPerson.forEach((own, person) => {
      if (roster.isIn[person] === 0) return;
      const cells = roster.cells.slice(person * roster.days, (person + 1) * roster.days);
      const key = cells.join();
      const end = roster.endOf(person);
      const known = own.get(key);
      own.delete(key);
      const cost = known?.cost ?? costOf(roster.space, person, cells, end);
      own.set(key, known ?? { person, cells, end, cost });
      if (own.size <= linesAPerson) return;
      for (const oldest of own.keys()) {
        own.delete(oldest);
        return;
      }
    });
  }

  /** Lines found elsewhere. */
  add(patterns: readonly Pattern[]): void {
    for (const pattern of patterns) {
      const own = this.#byPerson[pattern.person];
      if (own && own.size < mostLinesAPerson) own.set(pattern.cells.join(), pattern);
    }
  }

  patterns(people?: readonly number[]): Pattern[] {
    const chosen = people ? people.map((person) => this.#byPerson[person]) : this.#byPerson;
    return chosen.flatMap((own) => (own ? [...own.values()] : []));
  }
}
