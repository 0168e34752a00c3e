'use client';

import { type ReactNode, useState } from 'react';
import { Button } from '@/app/_ui/button';
import { Caution } from '@/app/_ui/caution';
import { dateRange } from '@/app/_ui/clock';
import { TitleBlock } from '@/app/_ui/title-block';
import { Verdict } from '@/app/_ui/verdict';
import type { Coverage } from '@/modules/coverage';
import type { Footing } from '@/modules/problem';
import { useCoverage } from '../_coverage';
import { FloorDialogs, type OpenDialog } from './floor-dialogs';
import { floorRows, floorsIn } from './floor-rows';
import { FloorsAside } from './floors-aside';
import { FloorsPart } from './floors-part';
import type { Period } from './period';
import { PeriodChoice } from './period-choice';
import { standingFigures } from './standing-figures';
import { useFloorEdits } from './use-floor-edits';
import { useFloorNeeds } from './use-floor-needs';
import { useFooting } from './use-footing';

interface Props {
  readonly coverage: Coverage;
  readonly periods: readonly Period[];
  /** The period to show at first, and its hours. */
  readonly period: Period;
  readonly footing: Footing;
  readonly teamChoice: ReactNode;
}

/** The floors sheet: the weekly pattern, dates that differ, and whether contracts give the hours. */
export function FloorsSheet(props: Props) {
  const [period, setPeriod] = useState(props.period);
  const [dialog, setDialog] = useState<OpenDialog | null>(null);
  const coverage = useCoverage(props.coverage);
  const { team, skills, kinds } = coverage;
  const needs = useFloorNeeds(coverage);
  const edits = useFloorEdits(team.id);
  const isFirst = period.startsOn === props.period.startsOn;
  const footing = useFooting(team.id, period, isFirst ? props.footing : null);
  const shown = floorsIn(needs.floors, period);
  const rows = floorRows(shown, skills, kinds, period, team.currency);
  const openDialog = (next: OpenDialog | null) => {
    edits.save.reset();
    edits.setDate.reset();
    setDialog(next);
  };
  const parts = { coverage, period, rows, needs, edits, onOpen: openDialog };
  return (
    <>
      <Verdict
        lead="Least people on duty. The roster keeps to these, and says where it can’t."
        actions={
          <div className="flex flex-wrap items-end gap-2">
            <PeriodChoice periods={props.periods} period={period} onChoose={setPeriod} />
            {rows.length > 0 ? (
              <Button
                className="min-h-9! phone:min-h-11!"
                onClick={() => openDialog({ kind: 'floor', floor: null })}
              >
                Add a floor…
              </Button>
            ) : null}
          </div>
        }
      >
        Floors, {dateRange(period.startsOn, period.endsOn)}
      </Verdict>
      {props.teamChoice}
      <div className="grid items-start gap-x-9 gap-y-8 min-[75rem]:grid-cols-[minmax(0,1fr)_minmax(0,33rem)]">
        <FloorsPart key={period.startsOn} {...parts} />
        {rows.length > 0 ? <FloorsAside {...parts} footing={footing} /> : null}
      </div>
      <div className="mt-9">
        <Caution>
          Floors that protect life, such as ratios of carers, lifeguards or crew, must come from the
          authority or the licensed person responsible. Floorwright never lowers one by itself.
        </Caution>
      </div>
      <FloorDialogs
        dialog={dialog}
        coverage={coverage}
        rows={rows}
        period={period}
        edits={edits}
        onOpen={openDialog}
      />
      <TitleBlock figures={standingFigures(coverage, rows, period)} />
    </>
  );
}
