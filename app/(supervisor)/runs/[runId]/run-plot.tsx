import type { RunView } from '@/modules/roster';
import { formatMoney } from '@/modules/units';
import { gapOf, gapText } from '../gap';
import { plotGeometry } from './plot-geometry';

const frame = { width: 720, height: 300, left: 84, bottom: 24 };

/** Best cost falling, proven bound rising, and between them what waiting can still save. */
export function RunPlot({ run }: { readonly run: RunView }) {
  const plot = plotGeometry(run.events, frame);
  if (!plot) return null;
  const base = frame.height - frame.bottom;
  return (
    <figure className="pt-4">
      <svg
        role="img"
        aria-label={plotSentence(run)}
        viewBox={`0 0 ${frame.width} ${frame.height}`}
        className="w-full text-[0.625rem]"
      >
        {plot.costTicks.map(({ y, cents }) => (
          <g key={cents}>
            <line x1={frame.left} x2={frame.width} y1={y} y2={y} className="stroke-rule" />
            <text x={frame.left - 8} y={y + 4} textAnchor="end" className="fill-ink2">
              {formatMoney(cents, run.currency)}
            </text>
          </g>
        ))}
        {plot.timeTicks.map(({ x, seconds }) => (
          <text
            key={seconds}
            x={x}
            y={frame.height - 6}
            textAnchor={seconds === 0 ? 'start' : x > frame.width - 12 ? 'end' : 'middle'}
            className="fill-ink2"
          >
            {seconds} s
          </text>
        ))}
        <path d={plot.between} className="fill-act-wash" />
        <path d={plot.best} fill="none" strokeWidth={2.5} className="stroke-act" />
        <path d={plot.bound} fill="none" strokeWidth={2.5} className="stroke-ink" />
        <line x1={frame.left} x2={frame.width} y1={base} y2={base} className="stroke-ink" />
      </svg>
      <figcaption className="flex flex-wrap gap-x-6 text-second text-ink2">
        <span>
          <span aria-hidden="true" className="mr-2 inline-block h-[3px] w-6 bg-act align-middle" />
          best roster so far
        </span>
        <span>
          <span aria-hidden="true" className="mr-2 inline-block h-[3px] w-6 bg-ink align-middle" />
          proven: no roster can cost less
        </span>
        <span>The cost axis does not begin at zero.</span>
      </figcaption>
    </figure>
  );
}

function plotSentence(run: RunView): string {
  const gap = gapOf(run);
  if (run.bestCostCents === null || gap === null) return 'No roster and bound to compare yet.';
  return `Best roster ${formatMoney(run.bestCostCents, run.currency)}, at most ${gapText(gap)} above the cheapest possible.`;
}
