import type {
  Instance,
  InstanceCover,
  InstanceKind,
  InstancePerson,
  InstanceRequest,
} from './instance';
import { InstanceError, type InstanceLine, readSections, type SectionName } from './instance-lines';

const staffFields = [
  'ID',
  'MaxShifts',
  'MaxTotalMinutes',
  'MinTotalMinutes',
  'MaxConsecutiveShifts',
  'MinConsecutiveShifts',
  'MinConsecutiveDaysOff',
  'MaxWeekends',
];
const requestFields = ['EmployeeID', 'Day', 'ShiftID', 'Weight'];
const coverFields = ['Day', 'ShiftID', 'Requirement', 'Weight for under', 'Weight for over'];

/**
 * Reads an instance of the open format: plain text in sections, fields separated by commas. Throws
 * `InstanceError` with file, line and section on anything it does not understand. `file` is the name
 * that messages use.
 */
export function readInstance(text: string, file: string): Instance {
  const sections = readSections(text, file);
  const required = (name: SectionName): readonly InstanceLine[] => {
    const lines = sections.get(name);
    if (lines?.length) return lines;
    throw new InstanceError(`${file}: ${name} is ${lines ? 'empty' : 'missing'}.`);
  };
  const optional = (name: SectionName) => sections.get(name) ?? [];

  const dayCount = readHorizon(required('SECTION_HORIZON'));
  const kinds = readKinds(required('SECTION_SHIFTS'));
  const people = readPeople(required('SECTION_STAFF'), kinds);
  const known: Known = {
    dayCount,
    kindIds: new Set(kinds.map(({ id }) => id)),
    personIds: new Set(people.map(({ id }) => id)),
  };
  const daysOff = readDaysOff(optional('SECTION_DAYS_OFF'), known);
  return {
    dayCount,
    kinds,
    people: people.map((person) => ({ ...person, daysOff: daysOff.get(person.id) ?? [] })),
    onRequests: optional('SECTION_SHIFT_ON_REQUESTS').map((line) => readRequest(line, known)),
    offRequests: optional('SECTION_SHIFT_OFF_REQUESTS').map((line) => readRequest(line, known)),
    cover: readCover(required('SECTION_COVER'), known),
  };
}

interface Known {
  readonly dayCount: number;
  readonly kindIds: ReadonlySet<string>;
  readonly personIds: ReadonlySet<string>;
}

function readHorizon([line, more]: readonly InstanceLine[]): number {
  line?.expectFields(['horizon length in days']);
  more?.fail('the horizon has one line.');
  return line?.whole(0, 'The horizon', 1) ?? 0;
}

function readKinds(lines: readonly InstanceLine[]): InstanceKind[] {
  const ids = uniqueIds(lines);
  return lines.map((line) => {
    line.expectFields(['ShiftID', 'Length in mins', 'Shifts which cannot follow this shift']);
    const mayNotPrecede = line.parts(2);
    const unknown = mayNotPrecede.find((id) => !ids.has(id));
    if (unknown !== undefined) line.fail(`shift ${unknown} is unknown.`);
    return { id: line.text(0), minutes: line.whole(1, 'The length', 1), mayNotPrecede };
  });
}

function readPeople(
  lines: readonly InstanceLine[],
  kinds: readonly InstanceKind[],
): Omit<InstancePerson, 'daysOff'>[] {
  uniqueIds(lines);
  return lines.map((line) => {
    line.expectFields(staffFields);
    const person = {
      id: line.text(0),
      mostOfKind: readMostOfKind(line, kinds),
      mostMinutes: line.whole(2, 'MaxTotalMinutes'),
      leastMinutes: line.whole(3, 'MinTotalMinutes'),
      longestRun: line.whole(4, 'MaxConsecutiveShifts', 1),
      shortestRun: line.whole(5, 'MinConsecutiveShifts', 1),
      shortestFreeRun: line.whole(6, 'MinConsecutiveDaysOff', 1),
      mostWeekends: line.whole(7, 'MaxWeekends'),
    };
    if (person.leastMinutes > person.mostMinutes) {
      line.fail(`MinTotalMinutes ${person.leastMinutes} is above MaxTotalMinutes.`);
    }
    return person;
  });
}

function readMostOfKind(line: InstanceLine, kinds: readonly InstanceKind[]): Map<string, number> {
  const most = new Map<string, number>();
  for (const part of line.parts(1)) {
    const [kindId = '', limit = ''] = part.split('=');
    if (!kinds.some(({ id }) => id === kindId)) line.fail(`shift ${kindId} is unknown.`);
    most.set(kindId, line.readWhole(limit, `The most of ${kindId}`));
  }
  return most;
}

function readDaysOff(lines: readonly InstanceLine[], known: Known): Map<string, number[]> {
  const daysOff = new Map<string, number[]>();
  for (const line of lines) {
    const personId = knownPerson(line, 0, known);
    const days = line.texts(1).map((_, index) => knownDay(line, index + 1, known));
    daysOff.set(personId, [...(daysOff.get(personId) ?? []), ...days]);
  }
  return daysOff;
}

function readRequest(line: InstanceLine, known: Known): InstanceRequest {
  line.expectFields(requestFields);
  return {
    personId: knownPerson(line, 0, known),
    day: knownDay(line, 1, known),
    kindId: knownKind(line, 2, known),
    weight: line.whole(3, 'The weight'),
  };
}

function readCover(lines: readonly InstanceLine[], known: Known): InstanceCover[] {
  const places = new Set<string>();
  return lines.map((line) => {
    line.expectFields(coverFields);
    const day = knownDay(line, 0, known);
    const kindId = knownKind(line, 1, known);
    if (places.has(`${day} ${kindId}`))
      line.fail(`shift ${kindId} of day ${day} stands here twice.`);
    places.add(`${day} ${kindId}`);
    return {
      day,
      kindId,
      need: line.whole(2, 'The requirement'),
      underWeight: line.whole(3, 'The weight for under'),
      overWeight: line.whole(4, 'The weight for over'),
    };
  });
}

/** The first fields of the lines; refuses an empty one and one that stands twice. */
function uniqueIds(lines: readonly InstanceLine[]): ReadonlySet<string> {
  const ids = new Set<string>();
  for (const line of lines) {
    const id = line.text(0);
    if (id === '') line.fail('the id is empty.');
    if (ids.has(id)) line.fail(`${id} stands here twice.`);
    ids.add(id);
  }
  return ids;
}

function knownPerson(line: InstanceLine, position: number, { personIds }: Known): string {
  const id = line.text(position);
  return personIds.has(id) ? id : line.fail(`person ${id} is unknown.`);
}

function knownKind(line: InstanceLine, position: number, { kindIds }: Known): string {
  const id = line.text(position);
  return kindIds.has(id) ? id : line.fail(`shift ${id} is unknown.`);
}

function knownDay(line: InstanceLine, position: number, { dayCount }: Known): number {
  const day = line.whole(position, 'The day');
  return day < dayCount ? day : line.fail(`day ${day} is beyond the last, ${dayCount - 1}.`);
}
