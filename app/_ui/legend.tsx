import type { BoardKind } from '@/modules/roster';
import { clockRange } from './clock';
import { Brick } from './people-grid/brick';

interface Props {
  readonly kinds: readonly Pick<
    BoardKind,
    'id' | 'name' | 'letter' | 'tone' | 'startMinute' | 'endMinute'
  >[];
}

/** The key of the board, always in view and printed with it: line, fill, hatch and bricks in words. */
export function Legend({ kinds }: Props) {
  return (
    <ul
      aria-label="Key"
      className="flex flex-wrap items-center gap-x-4 gap-y-1 py-1 text-note text-ink2"
    >
      <Entry words="floor, the least people on duty">
        <span className="w-5 border-t-3 border-ink" />
      </Entry>
      <Entry words="covered">
        <span className="h-3 w-5 bg-stone" />
      </Entry>
      <Entry words="short">
        <span className="hatch h-3 w-5" />
      </Entry>
      <Entry words="spare">
        <span className="h-3 w-5 border border-edge bg-spare" />
      </Entry>
      {kinds.map((kind) => (
        <Entry key={kind.id} words={`${kind.name} ${clockRange(kind.startMinute, kind.endMinute)}`}>
          <Brick kind={kind} letter={kind.letter} className="h-5 min-w-4 px-0.5" />
        </Entry>
      ))}
      <Entry words="second skill">
        <span className="h-5 w-4 border-[1.25px] border-dashed border-ink" />
      </Entry>
      <Entry words="period before, or home in another group">
        <span className="h-5 w-4 border-[1.25px] border-edge" />
      </Entry>
    </ul>
  );
}

function Entry({
  words,
  children,
}: {
  readonly words: string;
  readonly children: React.ReactNode;
}) {
  return (
    <li className="flex items-center gap-1.5">
      <span aria-hidden="true" className="flex items-center">
        {children}
      </span>
      {words}
    </li>
  );
}
