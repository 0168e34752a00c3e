import { CallOutButton } from '../call-out';
import { toColumn } from './day-axis';

/** A numbered place on the drawing that leads to its entry in a list. */
export interface GraphicCallOut {
  readonly number: number;
  /** On the axis of the days. */
  readonly minute: number;
  /** What the entry says, read with the number. */
  readonly label: string;
  readonly isShort: boolean;
  readonly onPress: () => void;
}

interface Props {
  readonly callOuts: readonly GraphicCallOut[];
  readonly edges: readonly number[];
}

/** Buttons above the picture, outside of it, so that they are reached by keyboard and read aloud. */
export function CallOuts({ callOuts, edges }: Props) {
  const columns = Math.max(1, edges.length - 1);
  return callOuts.map(({ number, minute, label, isShort, onPress }) => (
    <CallOutButton
      key={number}
      number={number}
      isShort={isShort}
      aria-label={`${number}: ${label}`}
      onClick={onPress}
      className="absolute -top-13 -translate-x-1/2 after:absolute after:top-full after:left-1/2 after:h-6 after:w-px after:bg-current"
      style={{ left: `${(toColumn(edges, minute) * 100) / columns}%` }}
    />
  ));
}
