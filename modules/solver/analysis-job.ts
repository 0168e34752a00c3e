import type { PlannedRoster, Problem, Requirement } from '../problem';
import type { KnotOptions, KnotsAnswer } from './knots/knot';
import type { WayOut, WaysOutOptions } from './knots/way-out';
import type { MendOptions, MendOutcome } from './mend/mending';
import type { CurvePoint, FloorPrice, PriceOptions, PriceQuestion } from './prices/floor-price';

/** What can be asked about a problem besides its roster. */
export type AnalysisJob =
  | { readonly kind: 'knots'; readonly problem: Problem; readonly options: KnotOptions }
  | {
      readonly kind: 'waysOut';
      readonly problem: Problem;
      readonly members: readonly Requirement[];
      readonly options: WaysOutOptions;
    }
  | {
      readonly kind: 'prices';
      readonly problem: Problem;
      readonly questions: readonly PriceQuestion[];
      readonly options: PriceOptions;
    }
  | {
      readonly kind: 'floorCurve';
      readonly problem: Problem;
      readonly family: readonly PriceQuestion[];
      readonly changes: readonly number[];
      readonly options: { readonly limitSeconds: number };
    }
  | {
      readonly kind: 'peopleCurve';
      readonly problem: Problem;
      readonly personId: string;
      readonly mostMore: number;
      readonly options: { readonly limitSeconds: number };
    }
  | {
      readonly kind: 'mend';
      readonly problem: Problem;
      readonly roster: PlannedRoster;
      readonly options: MendOptions;
    };

/** What an analysis answers; null: the time was over before there was anything to tell. */
export type AnalysisAnswer =
  | KnotsAnswer
  | readonly WayOut[]
  | readonly FloorPrice[]
  | readonly CurvePoint[]
  | MendOutcome
  | null;
