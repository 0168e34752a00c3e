import { hours } from '@/app/_ui/clock';
import { SectionHead } from '@/app/_ui/section-head';
import type { RunView } from '@/modules/roster';
import { stageOneVerdict } from '../run-words';

const mostShown = 20;

/** Stage 1: whether the floors can be held, by skill, and what must stay short. */
export function StageOne({ run }: { readonly run: RunView }) {
  const { shortageMinutes, shortageBoundMinutes, bySkill, shortageLines } = run;
  const holds = shortageMinutes === 0;
  return (
    <section aria-labelledby="stage-one">
      <SectionHead
        id="stage-one"
        aside={
          <span className={`font-[660] ${holds ? 'text-holds' : 'text-ink2'}`}>
            {stageOneVerdict(run)}
          </span>
        }
      >
        Stage 1: can the floors be held?
      </SectionHead>
      <dl className="grid grid-cols-2 gap-4 pt-1 desk:grid-cols-4">
        {bySkill.map(({ skillId, name, neededMinutes, missingMinutes }) => (
          <div key={skillId ?? 'anybody'}>
            <dt className="font-[640]">{name}</dt>
            <dd
              className={
                missingMinutes > 0 && shortageMinutes !== null ? 'text-short' : 'text-ink2'
              }
            >
              {shortageMinutes === null
                ? `${hours(neededMinutes)} needed`
                : missingMinutes > 0
                  ? `short ${hours(missingMinutes)} of ${hours(neededMinutes)}`
                  : `${hours(neededMinutes)}, floor holds`}
            </dd>
          </div>
        ))}
      </dl>
      {shortageMinutes ? (
        <p className="pt-3">
          Short {hours(shortageMinutes)} in all
          {shortageBoundMinutes === null
            ? ''
            : `; no roster is short of less than ${hours(shortageBoundMinutes)}`}
          .
        </p>
      ) : null}
      {shortageLines.length > 0 ? (
        <>
          <ul className="list-disc pl-5 pt-1">
            {shortageLines.slice(0, mostShown).map((line) => (
              <li key={line}>{line}</li>
            ))}
          </ul>
          {shortageLines.length > mostShown ? (
            <p>and {shortageLines.length - mostShown} more</p>
          ) : null}
        </>
      ) : null}
    </section>
  );
}
