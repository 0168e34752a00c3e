import { Button } from '@/app/_ui/button';
import { hours } from '@/app/_ui/clock';
import { DimensionLine } from '@/app/_ui/dimension-line';
import { ProblemNote } from '@/app/_ui/problem-note';
import { SectionHead } from '@/app/_ui/section-head';
import type { Footing } from '@/modules/problem';
import { FootingBar } from './footing-bar';
import { footingHeadline, footingLead, skillBalance } from './footing-words';

interface Props {
  /** undefined while it is read. */
  readonly footing: Footing | undefined;
  readonly problem: unknown;
  readonly onTryAgain: () => void;
  /** Whether floors stand in the table that the sums leave out. */
  readonly leavesOut: boolean;
}

/** Hours that the floors need against hours that contracts give, in all and by skill. */
export function FootingPanel({ footing, problem, onTryAgain, leavesOut }: Props) {
  return (
    <section aria-labelledby="footing-head">
      <SectionHead id="footing-head">Hours needed, hours available</SectionHead>
      <ProblemNote problem={problem} action={<Button onClick={onTryAgain}>Try again</Button>} />
      {footing ? <Sums footing={footing} /> : null}
      {footing || problem ? null : <p className="text-ink2">Adding up the hours…</p>}
      {leavesOut ? (
        <p className="mt-1 text-second text-ink2">
          Wished and shared floors are not added up here.
        </p>
      ) : null}
    </section>
  );
}

function Sums({ footing }: { readonly footing: Footing }) {
  const { neededMinutes: needed, availableMinutes: given, bySkill } = footing;
  const scale = Math.max(needed, given);
  const skillScale = Math.max(
    ...bySkill.map((line) => Math.max(line.neededMinutes, line.ownMinutes)),
  );
  const width = (minutes: number) => ({ width: `${(minutes * 100) / Math.max(1, scale)}%` });
  return (
    <>
      <p className="text-verdict font-[660]">{footingHeadline(footing)}</p>
      <p className="mt-1 max-w-[46rem] text-ink2">
        The floors need at least {hours(needed)} of paid time, contracts give {hours(given)} after
        leave. {footingLead(footing)} Rest and leave, day by day, are tested in a run.
      </p>
      <div aria-hidden="true" className="mt-3 grid gap-1 pr-2">
        <div style={width(needed)}>
          <DimensionLine>floors need {hours(needed)}</DimensionLine>
        </div>
        <FootingBar needed={needed} given={given} scale={scale} />
        <div style={width(given)}>
          <DimensionLine>contracts give {hours(given)}</DimensionLine>
        </div>
      </div>
      <ul className="my-4 grid gap-2">
        {bySkill.map((line) => {
          const { needed: words, balance, isOver } = skillBalance(line);
          return (
            <li
              key={line.skillId ?? 'anybody'}
              className="grid grid-cols-[5rem_minmax(0,2fr)_minmax(0,3fr)] items-center gap-x-4 phone:grid-cols-[5rem_minmax(0,1fr)]"
            >
              <span className="truncate font-[660]">{line.skillId ? line.name : 'Anybody'}</span>
              <FootingBar
                needed={line.neededMinutes}
                given={line.ownMinutes}
                scale={skillScale}
                hasTick={line.skillId !== null}
              />
              <span className="text-second phone:col-start-2">
                {words},{' '}
                <span className={isOver ? 'font-[660] text-short' : 'text-ink2'}>{balance}</span>
              </span>
            </li>
          );
        })}
      </ul>
      <p className="text-note text-ink2">
        Filled: hours that contracts give. Thick tick: all they give. Hatched: hours that no
        contract of the skill gives. Light: hours left over.
      </p>
    </>
  );
}
