import { SectionHead } from '@/app/_ui/section-head';
import type { KnotView, RunView } from '@/modules/roster';
import { knotsVerdict, knotTitle } from './knot-words';
import { WaysOut } from './ways-out';

/** Knots of more members show the first of them; the sentence of such a knot says it all. */
const mostShown = 12;

/** What stands in the way of the floors, once a run could not hold them all. */
export function Knots({ run }: { readonly run: RunView }) {
  const { knots, isLookingForKnots } = run;
  if (!knots && !(isLookingForKnots && run.shortageMinutes !== 0)) return null;
  return (
    <section aria-labelledby="knots">
      <SectionHead id="knots">What stands in the way</SectionHead>
      {knots ? (
        <>
          <p className="pt-1 text-ink2">{knotsVerdict(knots)}</p>
          {knots.knots.map((knot, index) => (
            // biome-ignore lint/suspicious/noArrayIndexKey: a knot is known by its place in the run
            <Knot key={index} run={run} knot={knot} place={index} />
          ))}
        </>
      ) : (
        <p className="pt-1 text-ink2">
          Looking for what cannot be met together, for up to ten seconds. The draft does not wait
          for it.
        </p>
      )}
    </section>
  );
}

interface KnotProps {
  readonly run: RunView;
  readonly knot: KnotView;
  readonly place: number;
}

function Knot({ run, knot, place }: KnotProps) {
  const more = knot.members.length - mostShown;
  return (
    <article aria-labelledby={`knot-${place}`} className="border-b border-rule py-3">
      <h3 id={`knot-${place}`} className="font-[640]">
        {knotTitle(knot, place)}
      </h3>
      <ul className="list-disc pl-5 pt-1">
        {knot.members.slice(0, mostShown).map(({ words, asksPerson }) => (
          <li key={words}>
            {words}
            {asksPerson ? <span className="text-second text-ink2"> (ask first)</span> : null}
          </li>
        ))}
      </ul>
      {more > 0 ? <p>and {more} more</p> : null}
      <p className="pt-1 text-second text-ink2">
        {knot.isMinimal
          ? 'Proved smallest: without any one of these the others can be met.'
          : 'Not proved smallest: some of these may have no part in it.'}
      </p>
      {run.mayWorkOut ? <WaysOut run={run} place={place} /> : null}
    </article>
  );
}
