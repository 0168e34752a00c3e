import { hours } from '@/app/_ui/clock';
import { graphicStateOf, shortPlaces, shortPlaceText } from '@/app/_ui/floor-graphic';
import type { Board } from '@/modules/roster';

const mostShown = 12;

/** What is short, in words, by date, shift and skill; or that the floor holds. */
export function ShortageList({ board }: { readonly board: Board }) {
  if (graphicStateOf(board.lanes, board.proof !== null) !== 'cover') return null;
  const places = shortPlaces(board);
  if (places.length === 0) return null;
  return (
    <details className="pb-3 text-body">
      <summary className="inline-flex min-h-6 cursor-pointer items-center font-[660] text-short phone:min-h-11">
        Short {hours(board.proof?.shortageMinutes ?? 0)}: see where
      </summary>
      <ul className="mt-1 list-disc pl-5">
        {places.slice(0, mostShown).map((place) => (
          <li key={`${place.date} ${place.shiftName}`}>{shortPlaceText(place)}</li>
        ))}
      </ul>
      {places.length > mostShown ? <p>and {places.length - mostShown} more</p> : null}
    </details>
  );
}
