/** How cents and missed floors become one figure. */
export interface Scale {
  /** Pay that is the same for every roster: left out, or every gap would look small. */
  readonly fixedCents: number;
  /** What a missing person-minute on a firm floor weighs in the blended objective. */
  readonly missedMinuteCents: number;
  /** Open instances: every weight is whole, so that every figure is. */
  readonly isWhole: boolean;
}

/**
 * Cost and missing minutes as one figure in hundreds of cents (points of an open instance, or euros), as
 * the blended objective weighs them; null while one of the two is not known.
 */
export function figureOf(
  costCents: number | null,
  missedMinutes: number | null,
  { fixedCents, missedMinuteCents }: Scale,
): number | null {
  if (costCents === null || missedMinutes === null) return null;
  return (costCents - fixedCents + missedMinuteCents * missedMinutes) / 100;
}

/** The figure of a lower bound: where figures are whole, 606.2 says 607. */
export function boundFigureOf(
  costCents: number | null,
  missedMinutes: number | null,
  scale: Scale,
): number | null {
  const figure = figureOf(costCents, missedMinutes, scale);
  return figure !== null && scale.isWhole ? Math.ceil(figure - solverTolerance) : figure;
}

/** Bounds of solvers carry the errors of their arithmetic. */
const solverTolerance = 1e-6;
