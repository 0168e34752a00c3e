'use client';

import { FloorGraphic } from '../_ui/floor-graphic';
import { exampleDay } from './example-day';

/** The drawing of one day with all it can show: held, spare and short. */
export function FloorExample() {
  return (
    <figure className="py-3">
      <FloorGraphic {...exampleDay} whose="nurses" state="cover" height={84} showsSentence />
      <figcaption className="mt-1 text-second text-ink2">
        An example day from 07:00 to 07:00. Two nurses are the floor from Early to Late and one at
        Night; three have Early, one has Late, one has Night.
      </figcaption>
    </figure>
  );
}
