import { useId } from 'react';
import type { Drawing } from './drawing';

interface Props {
  readonly drawing: Drawing;
  readonly width: number;
  readonly height: number;
  /** Bands behind weekends: left edge and width in drawing units. */
  readonly bands: readonly { readonly x: number; readonly width: number }[];
  /** Read in place of the picture; left out where the numbers stand beside it. */
  readonly sentence?: string | undefined;
  readonly className?: string;
  /** Set while the width is only assumed: the drawing is stretched, and words would be too. */
  readonly isStretched?: boolean;
}

/**
 * The picture of a floor graphic, in the paint order that keeps the floor line on top. Until its width is
 * known it is stretched to the room it has.
 */
export function FloorDrawing({ drawing, width, height, bands, sentence, ...look }: Props) {
  const hatchId = useId();
  const { baselineY, lineWidth, hatchPitch } = drawing;
  const labels = look.isStretched ? [] : drawing.labels;
  return (
    <svg
      viewBox={`0 0 ${width} ${height}`}
      preserveAspectRatio="none"
      className={`block overflow-visible ${look.className ?? ''}`}
      role={sentence ? 'img' : undefined}
      aria-label={sentence}
      aria-hidden={sentence ? undefined : true}
    >
      <Hatch id={hatchId} pitch={hatchPitch} />
      <g shapeRendering="crispEdges">
        {bands.map((band) => (
          <rect key={band.x} {...band} y={0} height={height} className="fill-recess" />
        ))}
        <path d={drawing.spare} className="fill-spare stroke-edge" strokeWidth="1" />
        <path d={drawing.hold} className="fill-stone" />
        <path d={drawing.courses} className="fill-none stroke-paper" strokeWidth="1" />
      </g>
      <path d={drawing.short} className="fill-paper" />
      <path
        d={drawing.short}
        fill={`url(#${hatchId})`}
        className="stroke-short"
        strokeWidth="1.25"
      />
      {labels.map(({ x, y, text }) => (
        <text
          key={`${x} ${y}`}
          x={x}
          y={y}
          textAnchor="middle"
          strokeWidth="3"
          className="fill-short stroke-paper text-[11px] font-[700] [paint-order:stroke]"
        >
          {text}
        </text>
      ))}
      <path d={`M0 ${baselineY}H${width}`} className="stroke-ink" strokeWidth="1.5" />
      <path
        d={drawing.floorLine}
        className="fill-none stroke-ink"
        strokeWidth={lineWidth}
        strokeLinejoin="miter"
        vectorEffect="non-scaling-stroke"
      />
    </svg>
  );
}

function Hatch({ id, pitch }: { readonly id: string; readonly pitch: number }) {
  return (
    <defs>
      <pattern
        id={id}
        width={pitch}
        height={pitch}
        patternUnits="userSpaceOnUse"
        patternTransform="rotate(45)"
      >
        <path d={`M.75 0V${pitch}`} className="stroke-short" strokeWidth="1.5" />
      </pattern>
    </defs>
  );
}
