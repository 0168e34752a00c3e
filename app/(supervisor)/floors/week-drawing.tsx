'use client';

import { useRef, useState } from 'react';
import { Button } from '@/app/_ui/button';
import { weekendBands } from '@/app/_ui/floor-graphic/bands';
import type { CoverStep } from '@/app/_ui/floor-graphic/cover-steps';
import { layOut } from '@/app/_ui/floor-graphic/drawing';
import { FloorDrawing } from '@/app/_ui/floor-graphic/floor-drawing';
import { useWidth } from '@/app/_ui/floor-graphic/use-width';
import { formatClock } from '@/modules/units';
import { weekInWords } from './normal-week';
import { WeekTable } from './week-table';

interface Props {
  readonly steps: readonly CoverStep[];
  readonly dayStartsAtMinute: number;
  readonly hasFloors: boolean;
}

const height = 88;
const widthBeforeMeasuring = 480;
const edges = Array.from({ length: 8 }, (_, day) => day * 1440);
const days = Array.from({ length: 7 }, (_, day) => ({ isWeekend: day > 4 }));

/** The floors of a normal week, hour by hour, drawn above the columns of its days. */
export function WeekDrawing({ steps, dayStartsAtMinute, hasFloors }: Props) {
  const [isTable, setTable] = useState(false);
  const strip = useRef<HTMLDivElement>(null);
  const width = useWidth(strip) ?? widthBeforeMeasuring;
  const state = hasFloors ? 'cover' : 'no-floors';
  const drawing = layOut({ steps, shortages: [], edges, width, height, state });
  const words = hasFloors
    ? `A normal week, people needed at once: ${weekInWords(steps)}.`
    : 'A normal week: no floors yet.';
  return (
    <>
      <div className="grid grid-cols-[15.5rem_minmax(0,1fr)_8.75rem] items-end phone:grid-cols-[9.5rem_minmax(0,1fr)_8.75rem]">
        <div className="sticky left-0 z-2 bg-paper pr-2 pb-1 text-note text-ink2">
          <p className="text-body font-[660] text-ink">A normal week</p>
          {hasFloors ? (
            <>
              <p>people needed, hour by hour from {formatClock(dayStartsAtMinute)}</p>
              <Button
                look="quiet"
                className="text-note! phone:min-h-8!"
                aria-expanded={isTable}
                onClick={() => setTable(!isTable)}
              >
                {isTable ? 'Hide the table' : 'Show as table'}
              </Button>
            </>
          ) : (
            <p>no floors yet</p>
          )}
        </div>
        <div ref={strip} style={{ height }}>
          <FloorDrawing
            drawing={drawing}
            width={width}
            height={height}
            bands={weekendBands(days, width)}
            sentence={words}
            className="h-full w-full"
          />
        </div>
      </div>
      {isTable ? <WeekTable steps={steps} dayStartsAtMinute={dayStartsAtMinute} /> : null}
    </>
  );
}
