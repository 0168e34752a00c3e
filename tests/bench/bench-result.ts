import type { CaseAnswer } from './case-messages';
import type { OutsideAnswer } from './outside-run';

/** A roster's figure, and the minutes by which floors are missed. */
export interface Judged {
  readonly objective: number | null;
  readonly missedMinutes: number | null;
}

/** What the engine, or HiGHS on the compact model, reached; every roster went through the proof. */
export type OwnResult = Omit<CaseAnswer, 'roster' | 'costCents'> & Judged;

/** Everything one case gave in one run. Missing methods were not asked for. */
export interface CaseResult {
  readonly name: string;
  readonly set: string;
  readonly people: number;
  readonly days: number;
  readonly kinds: number;
  readonly bestKnown: number | null;
  readonly engine: OwnResult;
  readonly highs?: OwnResult;
  readonly cbc?: OutsideAnswer;
  readonly glpsol?: OutsideAnswer;
}

/** (objective - bound) / objective; null while one is not known. */
export function gapOf({ objective, bound }: Pick<OwnResult, 'objective' | 'bound'>): number | null {
  if (objective === null || bound === null) return null;
  return objective === 0 ? 0 : (objective - bound) / Math.abs(objective);
}

/** The engine's objective by another; 1 when both are the same, null when one is not known. */
export function ratioTo(engine: number | null, other: number | null | undefined): number | null {
  if (engine === null || other === null || other === undefined) return null;
  if (engine === other) return 1;
  return other === 0 ? null : engine / other;
}
