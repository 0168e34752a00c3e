import type { TeamInfo } from '../access';
import type { Skill } from '../people';
import type { Floor, Holiday } from './floor';
import type { ShiftKind } from './shift-kind';

/** Everything the floors and shift kinds pages show of a team. Retired kinds are left out. */
export interface Coverage {
  readonly team: TeamInfo;
  readonly skills: readonly Skill[];
  readonly kinds: readonly ShiftKind[];
  readonly floors: readonly Floor[];
  readonly holidays: readonly Holiday[];
}
