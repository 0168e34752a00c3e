import { KindMark } from '@/app/_ui/kind-mark';
import type { Tone } from '@/modules/coverage';
import type { FloorRow } from './floor-rows';
import { topLine } from './top-line';

interface Props {
  readonly row: FloorRow;
  /** Tone of the shift kind with the same hours. */
  readonly tone: Tone | null;
}

/** Covers the hairline above the column of the skills, so that a group reads as one. */
const skillGap =
  'desk:before:absolute desk:before:-top-px desk:before:left-0 desk:before:h-0.5 desk:before:w-[4.75rem] desk:before:bg-paper';

/** Head of a row: the skill once for its group, the shift by name and hours, and what sets it apart. */
export function FloorRowHead({ row, tone }: Props) {
  const { kind, times, marks, skillName, isFirstOfSkill } = row;
  return (
    <th
      scope="row"
      className={`sticky left-0 z-2 bg-paper p-0 text-left font-normal ${topLine(row)} ${isFirstOfSkill ? '' : skillGap}`}
    >
      <div className="flex items-center py-1 phone:flex-col phone:items-start">
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
