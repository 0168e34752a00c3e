import type { ProbeAnswer } from './relaxation-probe';

/** A clash that has been made smaller. */
export interface FilteredClash {
  readonly kept: ReadonlySet<number>;
  /** Without any one of them the rest holds, by the test. */
  readonly necessary: ReadonlySet<number>;
}

/**
 * Deletion filter (Chinneck and Dravnieks, ORSA J. Computing 3, 1991, 157-168) over `clash`, in its order,
 * with chunks: tries to do without a chunk; where the rest holds the chunk is halved, down to one member,
 * which is then necessary. An answer that is not known keeps the chunk and proves nothing.
 */
export function filterClash(
  clash: readonly number[],
  firstChunk: number,
  test: (kept: ReadonlySet<number>) => ProbeAnswer | null,
): FilteredClash {
  let kept: ReadonlySet<number> = new Set(clash);
  let open = clash;
  let size = Math.max(1, firstChunk);
  const necessary = new Set<number>();
  while (open.length > 0) {
    const chunk = new Set(open.slice(0, size));
    const answer = test(new Set([...kept].filter((member) => !chunk.has(member))));
    if (answer?.clashes) {
      kept = answer.used;
      open = open.filter((member) => answer.used.has(member));
    } else if (chunk.size > 1) {
      size = Math.ceil(chunk.size / 2);
    } else {
      if (answer) for (const member of chunk) necessary.add(member);
      open = open.slice(1);
    }
  }
  return { kept, necessary };
}
