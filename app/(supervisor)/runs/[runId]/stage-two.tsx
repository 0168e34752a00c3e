import { Figure } from '@/app/_ui/figure';
import { Money } from '@/app/_ui/money';
import { SectionHead } from '@/app/_ui/section-head';
import type { RunView } from '@/modules/roster';
import { gapOf, gapText } from '../gap';
import { RunPlot } from './run-plot';

/** Stage 2: the best cost so far, what no roster can be below, and what waiting can still save. */
export function StageTwo({ run }: { readonly run: RunView }) {
  const { bestCostCents, boundCents, currency, events } = run;
  const gap = gapOf(run);
  const last = events.at(-1);
  const seconds = Math.round((last?.elapsedMs ?? 0) / 1000);
  return (
    <section aria-labelledby="stage-two">
      <SectionHead
        id="stage-two"
        aside={
          <span className="text-ink2">
            {seconds} s of at most {run.limitSeconds} s
          </span>
        }
      >
        Stage 2: what is the cheapest roster?
      </SectionHead>
      {bestCostCents === null && boundCents === null ? (
        <p className="pt-1 text-ink2">Begins when stage 1 is answered.</p>
      ) : (
        <div className="flex flex-wrap gap-x-9 gap-y-3 pt-1">
          <Figure label="Best roster so far" tone="act">
            {bestCostCents === null ? (
              'none yet'
            ) : (
              <Money cents={bestCostCents} currency={currency} />
            )}
          </Figure>
          {boundCents === null ? null : (
            <Figure label="Proven: no roster can cost less than">
              <Money cents={boundCents} currency={currency} />
            </Figure>
          )}
          {gap === null || bestCostCents === null || boundCents === null ? null : (
            <Figure label="Most that waiting can still save" note={gapText(gap)}>
              <Money cents={Math.max(0, bestCostCents - boundCents)} currency={currency} />
            </Figure>
          )}
        </div>
      )}
      <RunPlot run={run} />
    </section>
  );
}
