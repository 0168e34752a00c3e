import { KindMark } from '@/app/_ui/kind-mark';
import type { Tone } from '@/modules/coverage';
import type { FloorRow } from './floor-rows';
import { topLine } from './top-line';

interface Props {
  readonly row: FloorRow;
  /** Tone of the shift kind with the same hours. */
  readonly tone: Tone | null;
}

/** A hairline that leaves out the column of the skills. */
const skillGap =
  'before:absolute before:-top-px before:right-0 before:left-[4.75rem] before:h-px before:bg-rule phone:before:left-0';

/** Head of a row: the skill once for its group, the shift by name and hours, and what sets it apart. */
export function FloorRowHead({ row, tone }: Props) {
  const { kind, times, marks, skillName, isFirstOfSkill } = row;
  return (
    <th
      scope="row"
      className={`sticky left-0 z-2 bg-paper p-0 text-left font-normal ${isFirstOfSkill ? topLine(row) : skillGap}`}
    >
      <div className="flex items-center phone:flex-col phone:items-start phone:py-1">
        <span
          // Named once for the eye, on every row for screen readers.
          className={`shrink-0 truncate font-[660] desk:w-[4.75rem] ${isFirstOfSkill ? '' : 'phone:sr-only desk:opacity-0'}`}
        >
          {skillName}
        </span>
        <span className="min-w-0">
          <span className="flex items-center gap-1.5 phone:flex-wrap">
            {kind && tone !== null ? <KindMark kind={kind} tone={tone} /> : null}
            {kind ? <span className="truncate">{kind.name}</span> : null}
            <span className="figures text-note text-ink2">{times}</span>
          </span>
          {marks.map((mark) => (
            <span key={mark} className="block text-note text-ink2">
              {mark}
            </span>
          ))}
        </span>
      </div>
    </th>
  );
}
