/** Seconds after which a run is asked what it has. */
const readingSeconds = [3, 10, 30, 60] as const;

/** What a run knew at a moment; what it did not know yet is null. */
export interface Sighting {
  readonly seconds: number;
  readonly objective: number | null;
  readonly bound: number | null;
}

/** The best objective and bound of a run as time went by, from its reports. Smaller is better. */
export class BestSoFar {
  readonly #sightings: Sighting[] = [];

  /** Takes what is known now. A worse objective or bound than before is no news. */
  see({ seconds, objective, bound }: Sighting): void {
    const last = this.#sightings.at(-1);
    const now = {
      seconds,
      objective: better(Math.min, last?.objective ?? null, objective),
      bound: better(Math.max, last?.bound ?? null, bound),
    };
    if (last && last.objective === now.objective && last.bound === now.bound) return;
    this.#sightings.push(now);
  }

  /** The best objective at that time; null before the first. */
  objectiveAt(seconds: number): number | null {
    return this.#sightings.findLast((sighting) => sighting.seconds <= seconds)?.objective ?? null;
  }

  /** By second, only times within the limit: `{"3": 812, "10": 790}`. */
  readings(limitSeconds: number, places: readonly number[] = readingSeconds) {
    const within = places.filter((seconds) => seconds <= limitSeconds);
    return Object.fromEntries(within.map((seconds) => [seconds, this.objectiveAt(seconds)]));
  }

  /** Seconds until (objective - bound) <= gap x objective was proven; null when never. */
  secondsToGap(gap: number): number | null {
    const reached = this.#sightings.find(
      ({ objective, bound }) =>
        objective !== null && bound !== null && objective - bound <= gap * Math.abs(objective),
    );
    return reached?.seconds ?? null;
  }
}

function better(
  pick: (one: number, other: number) => number,
  before: number | null,
  now: number | null,
): number | null {
  if (before === null || now === null) return before ?? now;
  return pick(before, now);
}
