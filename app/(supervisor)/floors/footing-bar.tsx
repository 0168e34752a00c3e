import { barShares } from './footing-words';

interface Props {
  /** Minutes. */
  readonly needed: number;
  readonly given: number;
  /** Minutes at the right end. */
  readonly scale: number;
  /** Whether contracts stand behind it. */
  readonly hasTick?: boolean;
}

/** A bar of hours. Decoration: the same stands in words beside it. */
export function FootingBar({ needed, given, scale, hasTick = true }: Props) {
  const { held, missing, left } = barShares(needed, given, scale);
  const tickAt = held + left;
  return (
    <span aria-hidden="true" className="relative my-1 flex h-4">
      <span className="bg-stone" style={{ width: `${held}%` }} />
      {left > 0 ? (
        <span className="border border-l-0 border-edge bg-spare" style={{ width: `${left}%` }} />
      ) : null}
      {missing > 0 ? (
        <span className={hasTick ? 'hatch min-w-1' : 'bg-stone'} style={{ width: `${missing}%` }} />
      ) : null}
      {hasTick ? (
        <span
          className="absolute -inset-y-1 w-[3px] -translate-x-1/2 bg-ink"
          style={{ left: `${tickAt}%` }}
        />
      ) : null}
    </span>
  );
}
