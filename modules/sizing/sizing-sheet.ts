import type { TeamInfo } from '../access';
import type { ShiftKind } from '../coverage';
import type { Skill } from '../people';
import type { Sizing } from './sizing';
import type { SizingInput } from './sizing-input';

/** Everything the sizing page shows of a team before anything is asked. */
export interface SizingSheet {
  readonly team: TeamInfo;
  readonly skills: readonly Skill[];
  /** Shift kinds in use. */
  readonly kinds: readonly ShiftKind[];
  /** A table to begin with, made from the floors; without floors it has no lines. */
  readonly beginning: SizingInput;
  /** What was asked last, with its answer; null before the first time. */
  readonly latest: Sizing | null;
}
