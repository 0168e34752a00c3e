import { type Cents, formatMoney } from '@/modules/units';

interface Props {
  readonly cents: Cents;
  readonly currency: string;
  /** 2 shows minor units. */
  readonly digits?: 0 | 2;
}

/** An amount in the word face with figures of one width. */
export function Money({ cents, currency, digits = 0 }: Props) {
  return (
    <span className="whitespace-nowrap tabular-nums">
      {formatMoney(cents, currency, 'en-GB', digits)}
    </span>
  );
}
