import { KindMark } from '../kind-mark';
import { blockTimes } from './block-words';
import { type Block, kindsOf } from './blocks';

/** What the bricks in view stand for. */
export function CalendarKey({ blocks }: { readonly blocks: readonly Block[] }) {
  const kinds = kindsOf(blocks);
  if (kinds.length === 0) return null;
  return (
    <ul
      aria-label="Shift kinds"
      className="flex flex-wrap gap-x-5 gap-y-1 py-2 text-second text-ink2"
    >
      {kinds.map((block) => (
        <li key={block.kindName} className="flex items-center gap-1.5">
          <KindMark kind={block} tone={block.tone} />
          {block.kindName} {blockTimes(block)}
        </li>
      ))}
    </ul>
  );
}
