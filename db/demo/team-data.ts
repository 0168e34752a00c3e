import type { FloorInput, ShiftKindInput } from '../../modules/coverage';
import type { Contract } from '../../modules/people';
import type { teams } from '../schema';

/** Names stand for ids; days count from 1 within a period. */
export interface DemoTeam {
  readonly settings: Omit<typeof teams.$inferInsert, 'id' | 'organisationId'>;
  readonly supervisor: string;
  readonly skills: readonly string[];
  readonly kinds: readonly Omit<ShiftKindInput, 'skillIds'>[];
  readonly floors: readonly DemoFloor[];
  readonly people: readonly DemoPerson[];
  readonly holidays: readonly { readonly day: number; readonly name: string }[];
  readonly leave: readonly DemoLeave[];
}

export type DemoFloor = Omit<FloorInput, 'skillId' | 'effectiveFrom' | 'effectiveTo'> & {
  readonly skill: string | null;
  /** In the draft period. */
  readonly dates: readonly DemoFloorDate[];
};

export interface DemoFloorDate {
  readonly day: number;
  readonly people: number;
  readonly reason: string;
}

export interface DemoPerson {
  readonly name: string;
  readonly staffNumber: string;
  /** Home skill first. */
  readonly skills: readonly string[];
  readonly contract: Omit<Contract, 'startsOn' | 'endsOn'>;
}

/** Whole days, both included; each counts as 8 hours worked. */
export interface DemoLeave {
  readonly period: 'running' | 'draft';
  readonly name: string;
  readonly from: number;
  readonly to: number;
}

export const hours = (count: number): number => count * 60;
