import type { SizingAnswer, SizingProblem } from '../problem';
import type { Id } from '../units';
import type { SizingInput } from './sizing-input';

/** One sizing as stored: what was asked, the model it became, and its answer. */
export interface Sizing {
  readonly id: Id<'siz'>;
  /** Milliseconds since 1970. */
  readonly askedAtUtc: number;
  readonly input: SizingInput;
  readonly problem: SizingProblem;
  readonly answer: SizingAnswer;
}
