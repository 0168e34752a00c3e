import type { FieldError } from '../units';
import { type Problem, type ProblemPerson, rulesOf } from './problem';
import type { TeamRule } from './team-rules';

/** Everything in a document that names a person, day, shift, kind or skill which is not in it. */
export function findReferenceFaults(problem: Problem): FieldError[] {
  const book = new NameBook(problem);
  checkShifts(problem, book);
  for (const list of ['floors', 'ceilings'] as const) {
    problem[list].forEach((window, index) => {
      const path = `${list}.${index}`;
      if (window.skillId !== null) book.skill(`${path}.skillId`, window.skillId);
      if (window.endMinute <= window.startMinute) {
        book.note(`${path}.endMinute`, 'ends before it starts; exchange the two');
      }
    });
  }
  checkPeople(problem, book);
  checkKindPairs(problem.rules, 'rules', book);
  problem.teamRules.forEach((rule, index) => {
    checkTeamRule(rule, `teamRules.${index}`, book);
  });
  return book.faults;
}

/** What there is to be named, and a note of what is named but is not there. */
class NameBook {
  readonly faults: FieldError[] = [];
  readonly #problem: Problem;
  readonly #people: ReadonlySet<string>;
  readonly #kinds: ReadonlySet<string>;
  readonly #skills: ReadonlySet<string>;

  constructor(problem: Problem) {
    this.#problem = problem;
    this.#people = new Set(problem.people.map(({ id }) => id));
    this.#kinds = new Set(problem.shifts.map(({ kindId }) => kindId));
    this.#skills = new Set(problem.skills.map(({ id }) => id));
  }

  note(path: string, what: string): void {
    this.faults.push({ path, message: `${path} ${what}.` });
  }

  person(path: string, id: string): void {
    if (!this.#people.has(id)) this.#missing(path, 'person', id);
  }

  kind(path: string, id: string): void {
    if (!this.#kinds.has(id)) this.#missing(path, 'shift kind', id);
  }

  skill(path: string, id: string): void {
    if (!this.#skills.has(id)) this.#missing(path, 'skill', id);
  }

  day(path: string, index: number): void {
    if (!this.#problem.days[index]) this.#missing(path, 'day', index);
  }

  /** A shift, which must be of the day where one is given. */
  shift(path: string, index: number, dayIndex?: number): void {
    const shift = this.#problem.shifts[index];
    if (!shift) this.#missing(path, 'shift', index);
    else if (dayIndex !== undefined && shift.dayIndex !== dayIndex) {
      this.note(path, `names the shift ${index}, which starts on another day; correct one of them`);
    }
  }

  #missing(path: string, what: string, name: string | number): void {
    this.note(path, `names the ${what} ${name}, which this problem does not have; correct it`);
  }
}

function checkShifts(problem: Problem, book: NameBook): void {
  problem.shifts.forEach((shift, index) => {
    const path = `shifts.${index}`;
    if (shift.index !== index) book.note(`${path}.index`, 'is not its position; number the shifts');
    book.day(`${path}.dayIndex`, shift.dayIndex);
    for (const skill of shift.postSkillIds ?? []) book.skill(`${path}.postSkillIds`, skill);
  });
}

function checkPeople(problem: Problem, book: NameBook): void {
  const seen = new Set<string>();
  problem.people.forEach((person, index) => {
    const path = `people.${index}`;
    if (seen.has(person.id))
      book.note(`${path}.id`, 'is taken; give each person an id of their own');
    seen.add(person.id);
    for (const skill of person.skillIds) book.skill(`${path}.skillIds`, skill);
    checkCells(person, path, book);
    for (const { kindId } of person.kindLimits) book.kind(`${path}.kindLimits`, kindId);
    if (person.rules) checkKindPairs(rulesOf(problem, person), `${path}.rules`, book);
  });
}

function checkCells(person: ProblemPerson, path: string, book: NameBook): void {
  for (const list of ['pins', 'wishes'] as const) {
    person[list].forEach(({ dayIndex, shiftIndex }, index) => {
      book.day(`${path}.${list}.${index}.dayIndex`, dayIndex);
      if (shiftIndex !== null) {
        book.shift(`${path}.${list}.${index}.shiftIndex`, shiftIndex, dayIndex);
      }
    });
  }
}

function checkKindPairs(rules: Problem['rules'], path: string, book: NameBook): void {
  for (const { kindId, nextKindId } of rules.kindsThatMayNotFollow) {
    book.kind(`${path}.kindsThatMayNotFollow`, kindId);
    book.kind(`${path}.kindsThatMayNotFollow`, nextKindId);
  }
}

function checkTeamRule(rule: TeamRule, path: string, book: NameBook): void {
  if ('personIds' in rule) {
    for (const id of rule.personIds) book.person(`${path}.personIds`, id);
  }
  if (rule.kind !== 'linear') return;
  rule.terms.forEach(({ personId, shiftIndex }, index) => {
    book.person(`${path}.terms.${index}.personId`, personId);
    book.shift(`${path}.terms.${index}.shiftIndex`, shiftIndex);
  });
}
