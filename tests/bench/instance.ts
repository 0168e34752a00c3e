/*
 * One instance of the open benchmark for shift scheduling (T. Curtois and R. Qu, Computational results on
 * new staff scheduling benchmark instances, University of Nottingham, 2014), in its own words and units.
 * Days count from 0; day 0 is a Monday.
 */

export interface Instance {
  readonly dayCount: number;
  readonly kinds: readonly InstanceKind[];
  readonly people: readonly InstancePerson[];
  readonly onRequests: readonly InstanceRequest[];
  readonly offRequests: readonly InstanceRequest[];
  readonly cover: readonly InstanceCover[];
}

export interface InstanceKind {
  readonly id: string;
  readonly minutes: number;
  /** Kinds that may not start on the day after this one. */
  readonly mayNotPrecede: readonly string[];
}

export interface InstancePerson {
  readonly id: string;
  /** Most shifts of a kind in the horizon; a kind that is not named has no limit. */
  readonly mostOfKind: ReadonlyMap<string, number>;
  readonly mostMinutes: number;
  readonly leastMinutes: number;
  readonly longestRun: number;
  /** Fewest shifts, and fewest days off, in a row; runs that touch the first or last day are exempt. */
  readonly shortestRun: number;
  readonly shortestFreeRun: number;
  readonly mostWeekends: number;
  readonly daysOff: readonly number[];
}

export interface InstanceRequest {
  readonly personId: string;
  readonly day: number;
  readonly kindId: string;
  /** What it adds to the objective when it is not granted. */
  readonly weight: number;
}

export interface InstanceCover {
  readonly day: number;
  readonly kindId: string;
  readonly need: number;
  /** What each person below, and each above, the need adds to the objective. */
  readonly underWeight: number;
  readonly overWeight: number;
}

/** By person, one entry a day: the id of a kind, or '' for a day off. */
export type RosterTable = Readonly<Record<string, readonly string[]>>;

/** Most shifts of a kind that a person may have: the whole horizon where nothing is said. */
export const mostOf = (instance: Instance, person: InstancePerson, kindId: string): number =>
  person.mostOfKind.get(kindId) ?? instance.dayCount;
