import { hours } from '@/app/_ui/clock';
import { FloorGraphic } from '@/app/_ui/floor-graphic';
import { Money } from '@/app/_ui/money';
import { SectionHead } from '@/app/_ui/section-head';
import type { RunView } from '@/modules/roster';
import { ProofList } from './proof-list';
import type { BoardFrame } from './run-sheet';

interface Props {
  readonly run: RunView;
  readonly frame: BoardFrame;
}

/** The best roster so far as a drawing, what it costs, and the rules it keeps. */
export function BestRoster({ run, frame }: Props) {
  const hasRoster = run.shortageMinutes !== null;
  return (
    <div className="grid content-start gap-6">
      <section aria-labelledby="best-roster">
        <SectionHead id="best-roster">
          {run.state === 'running' ? 'The best roster so far' : 'The best roster'}
        </SectionHead>
        <FloorGraphic
          days={frame.days}
          dayStartsAtMinute={frame.dayStartsAtMinute}
          kinds={frame.kinds}
          skills={frame.skills}
          lanes={run.lanes}
          whose="all skills"
          grain="day"
          state={hasRoster ? 'cover' : 'no-roster'}
        />
        {run.proof && run.bestCostCents !== null ? <CostTable run={run} /> : null}
      </section>
      <ProofList run={run} />
    </div>
  );
}

function CostTable({ run }: { readonly run: RunView }) {
  const { proof, currency } = run;
  if (!proof) return null;
  const rows = [
    ['Contract pay', proof.contractPayCents],
    ['Night, weekend and holiday pay', proof.premiumPayCents],
    [`Overtime, ${hours(proof.overtimeMinutes)}`, proof.overtimePayCents],
    ...(proof.wishedShortageCents > 0
      ? ([['Wished floors not held, at their price', proof.wishedShortageCents]] as const)
      : []),
  ] as const;
  return (
    <table className="mt-4 w-full">
      <caption className="sr-only">What the roster costs</caption>
      <tbody>
        {rows.map(([label, cents]) => (
          <tr key={label} className="border-b border-rule">
            <th scope="row" className="py-1 text-left font-normal">
              {label}
            </th>
            <td className="py-1 text-right">
              <Money cents={cents} currency={currency} />
            </td>
          </tr>
        ))}
        <tr className="font-[660]">
          <th scope="row" className="py-1 text-left">
            Cost of this roster
          </th>
          <td className="py-1 text-right">
            <Money cents={proof.costCents} currency={currency} />
          </td>
        </tr>
      </tbody>
    </table>
  );
}
