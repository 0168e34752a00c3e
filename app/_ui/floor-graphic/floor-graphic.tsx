'use client';

import { useMemo, useRef, useState } from 'react';
import { Button } from '../button';
import { weekendBands } from './bands';
import { CallOuts, type GraphicCallOut } from './call-outs';
import { coverSteps, dailySteps } from './cover-steps';
import { CoverTable } from './cover-table';
import { columnEdges } from './day-axis';
import { DayEnds } from './day-ends';
import { type GraphicState, layOut } from './drawing';
import { FloorDrawing } from './floor-drawing';
import { type CoverWords, coverSentence, labelledShortages } from './sentence';
import { inRem, useWidth } from './use-width';

interface Props extends CoverWords {
  /** Whose cover: `all skills`, `Vet`. */
  readonly whose: string;
  readonly state: GraphicState;
  /** Height of the drawing in drawing units, pixels at normal text size. */
  readonly height?: number;
  /** hour: true hours, while there is room. day: one tread a day, in person-hours. */
  readonly grain?: 'hour' | 'day';
  /** Shows the exceptions as text below; otherwise they stand behind a button. */
  readonly showsSentence?: boolean;
  readonly callOuts?: readonly GraphicCallOut[];
}

const widthBeforeMeasuring = 720;
/** Below this a day has no room for the line to step inside it. */
const narrowestHourlyDay = 18;

/** Floors and cover over a period as a drawing, with the same in words and as a table. */
export function FloorGraphic(props: Props) {
  const { state, height = 96, whose, callOuts = [] } = props;
  const strip = useRef<HTMLDivElement>(null);
  const measured = useWidth(strip);
  const width = measured ?? widthBeforeMeasuring;
  const isNarrow = width / Math.max(1, props.days.length) < narrowestHourlyDay;
  const grain = isNarrow ? 'day' : (props.grain ?? 'hour');
  const edges = useMemo(
    () => columnEdges(props.days, props.dayStartsAtMinute),
    [props.days, props.dayStartsAtMinute],
  );
  const steps = useMemo(
    () => (grain === 'day' ? dailySteps(props.lanes, edges) : coverSteps(props.lanes)),
    [props.lanes, edges, grain],
  );
  const sentence = coverSentence(props, whose, state);
  const shortages = grain === 'hour' && state === 'cover' ? labelledShortages(props) : [];
  const drawing = layOut({ steps, shortages, edges, width, height, state });
  const topRoom = callOuts.length > 0 ? 'mt-14' : shortages.length > 0 ? 'mt-7' : 'mt-2';
  return (
    <div>
      <div ref={strip} className={`relative ${topRoom}`} style={{ height: inRem(height) }}>
        <FloorDrawing
          drawing={drawing}
          width={width}
          height={height}
          bands={weekendBands(props.days, width)}
          sentence={sentence}
          className="h-full w-full"
          isStretched={measured === null}
        />
        <CallOuts callOuts={callOuts} edges={edges} />
      </div>
      <DayEnds days={props.days} />
      <InWords {...props} sentence={sentence} />
    </div>
  );
}

function InWords(props: Props & { readonly sentence: string }) {
  const [shown, setShown] = useState<'nothing' | 'words' | 'table'>('nothing');
  const toggle = (next: 'words' | 'table') => setShown(shown === next ? 'nothing' : next);
  const showsWords = props.showsSentence || shown === 'words';
  return (
    <div className="text-second" data-print="off">
      <div className="flex flex-wrap gap-x-4">
        {props.showsSentence ? null : (
          <Button look="quiet" aria-expanded={shown === 'words'} onClick={() => toggle('words')}>
            {shown === 'words' ? 'Hide the words' : 'Say it in words'}
          </Button>
        )}
        {props.state === 'no-floors' ? null : (
          <Button look="quiet" aria-expanded={shown === 'table'} onClick={() => toggle('table')}>
            {shown === 'table' ? 'Hide the table' : 'Show as table'}
          </Button>
        )}
      </div>
      {showsWords ? <p className="max-w-[60rem]">{props.sentence}</p> : null}
      {shown === 'table' ? <CoverTable words={props} whose={props.whose} /> : null}
    </div>
  );
}
