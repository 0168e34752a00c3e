import { type Instance, type InstancePerson, mostOf, type RosterTable } from './instance';

/** A roster judged by the words of the file alone. */
export interface Score {
  /** Whole; of no account while a hard rule is broken. */
  readonly objective: number;
  /** One sentence for each hard rule that a person breaks; none for a lawful roster. */
  readonly breaches: readonly string[];
}

/**
 * Judges a roster straight from the instance: every hard rule, and the objective as the sum of the
 * weights of requests that are not granted and of cover below and above the need. Shares nothing with
 * the problem type, the engine or the proof.
 */
export function scoreRoster(instance: Instance, table: RosterTable): Score {
  const breaches = instance.people.flatMap((person) =>
    breachesOf(instance, person, table[person.id] ?? []).map((text) => `${person.id}: ${text}`),
  );
  const unknown = Object.keys(table).filter((id) => !instance.people.some((one) => one.id === id));
  return {
    objective: requestPoints(instance, table) + coverPoints(instance, table),
    breaches: [...breaches, ...unknown.map((id) => `${id} is no person of this instance.`)],
  };
}

function breachesOf(instance: Instance, person: InstancePerson, line: readonly string[]): string[] {
  if (line.length !== instance.dayCount) {
    return [`${line.length} days instead of ${instance.dayCount}.`];
  }
  const strange = line.find((id) => id !== '' && !instance.kinds.some((kind) => kind.id === id));
  if (strange !== undefined) return [`shift ${strange} is unknown.`];
  return [
    ...kindBreaches(instance, person, line),
    ...minuteBreaches(instance, person, line),
    ...followBreaches(instance, line),
    ...runBreaches(person, line),
    ...freedomBreaches(person, line),
  ];
}

function kindBreaches(instance: Instance, person: InstancePerson, line: readonly string[]) {
  return instance.kinds.flatMap(({ id }): string[] => {
    const count = line.filter((entry) => entry === id).length;
    const most = mostOf(instance, person, id);
    return count > most ? [`${count} shifts ${id}; the most is ${most}.`] : [];
  });
}

function minuteBreaches({ kinds }: Instance, person: InstancePerson, line: readonly string[]) {
  const minutes = line.reduce(
    (sum, entry) => sum + (kinds.find(({ id }) => id === entry)?.minutes ?? 0),
    0,
  );
  const { leastMinutes, mostMinutes } = person;
  if (minutes >= leastMinutes && minutes <= mostMinutes) return [];
  return [`${minutes} minutes; allowed are ${leastMinutes} to ${mostMinutes}.`];
}

function followBreaches({ kinds }: Instance, line: readonly string[]) {
  return line.flatMap((entry, day): string[] => {
    const next = line[day + 1] ?? '';
    const kind = kinds.find(({ id }) => id === entry);
    return next !== '' && kind?.mayNotPrecede.includes(next)
      ? [`shift ${next} of day ${day + 1} may not follow ${entry}.`]
      : [];
  });
}

interface Run {
  readonly isWork: boolean;
  readonly from: number;
  readonly length: number;
}

function runsOf(line: readonly string[]): Run[] {
  const starts = [...line.keys()].filter(
    (day) => day === 0 || (line[day] === '') !== (line[day - 1] === ''),
  );
  return starts.map((from, index) => ({
    isWork: line[from] !== '',
    from,
    length: (starts[index + 1] ?? line.length) - from,
  }));
}

function runBreaches(person: InstancePerson, line: readonly string[]): string[] {
  return runsOf(line).flatMap(({ isWork, from, length }): string[] => {
    const isAtEdge = from === 0 || from + length === line.length;
    const least = isWork ? person.shortestRun : person.shortestFreeRun;
    const run = `${length} ${isWork ? 'shifts' : 'days off'} in a row from day ${from}`;
    if (isWork && length > person.longestRun) return [`${run}; the most is ${person.longestRun}.`];
    return !isAtEdge && length < least ? [`${run}; the least is ${least}.`] : [];
  });
}

function freedomBreaches(person: InstancePerson, line: readonly string[]): string[] {
  const isWorked = (day: number) => (line[day] ?? '') !== '';
  const mondays = [...line.keys()].filter((day) => day % 7 === 0);
  const weekends = mondays.filter((day) => isWorked(day + 5) || isWorked(day + 6)).length;
  const lost = person.daysOff.filter(isWorked).map((day) => `day ${day} must be off.`);
  if (weekends <= person.mostWeekends) return lost;
  return [...lost, `${weekends} weekends; the most is ${person.mostWeekends}.`];
}

function requestPoints({ onRequests, offRequests }: Instance, table: RosterTable): number {
  const on = onRequests.filter(({ personId, day, kindId }) => table[personId]?.[day] !== kindId);
  const off = offRequests.filter(({ personId, day, kindId }) => table[personId]?.[day] === kindId);
  return [...on, ...off].reduce((sum, { weight }) => sum + weight, 0);
}

function coverPoints({ cover, people }: Instance, table: RosterTable): number {
  return cover.reduce((sum, { day, kindId, need, underWeight, overWeight }) => {
    const have = people.filter(({ id }) => table[id]?.[day] === kindId).length;
    return sum + Math.max(0, need - have) * underWeight + Math.max(0, have - need) * overWeight;
  }, 0);
}
