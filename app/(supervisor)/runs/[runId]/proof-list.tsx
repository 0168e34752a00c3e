import { Caution } from '@/app/_ui/caution';
import { SectionHead } from '@/app/_ui/section-head';
import { proofRules } from '@/modules/proof';
import type { RunView } from '@/modules/roster';

/** The limits every roster of the run keeps, each with its source, and what the re-check went through. */
export function ProofList({ run }: { readonly run: RunView }) {
  return (
    <section aria-labelledby="rules-held">
      <SectionHead id="rules-held">Held in every roster of this run</SectionHead>
      <dl>
        {run.rules.map(({ label, limit, source }) => (
          <div
            key={`${label} ${limit}`}
            className="grid grid-cols-[1fr_auto] gap-x-4 border-b border-rule py-1"
          >
            <dt>{label}</dt>
            <dd className="font-[640] whitespace-nowrap">{limit}</dd>
            <dd className="col-span-2 text-second text-ink2">{source}</dd>
          </div>
        ))}
      </dl>
      {run.proof?.bound ? <p className="pt-3">{run.proof.bound.sentence}</p> : null}
      {run.proof ? <Checked run={run} /> : null}
      <div className="pt-4">
        <Caution>
          Working-time rules differ by country, sector and agreement. This is no legal advice: local
          law, agreements and licensed practice come first. Long runs of nights, short rest and long
          shifts tire people even where a rule allows them.
        </Caution>
      </div>
    </section>
  );
}

function Checked({ run }: { readonly run: RunView }) {
  const labels: Record<string, string> = proofRules;
  return (
    <details className="pt-3">
      <summary className="inline-flex min-h-6 cursor-pointer items-center text-act underline underline-offset-3 phone:min-h-11">
        Re-checked by separate code: {run.proof?.breaches.length ?? 0} problems
      </summary>
      <ul className="list-disc pl-5 pt-1 text-second">
        {run.proof?.checked.map(({ rule, cases }) => (
          <li key={rule}>
            {labels[rule] ?? rule}: {cases.toLocaleString('en-GB')} checks
          </li>
        ))}
      </ul>
    </details>
  );
}
