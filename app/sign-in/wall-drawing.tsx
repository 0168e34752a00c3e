/** A calm stretch of floor line over its courses, with two places where somebody is missing. */
export function WallDrawing() {
  return (
    <aside aria-label="How to read the drawings" className="relative mt-auto overflow-hidden">
      <p className="px-(--page) pb-2 text-second text-ink2 desk:absolute desk:bottom-[88%] desk:left-[8.7%] desk:p-0">
        <strong className="font-[660] text-ink">The line is the floor.</strong> The fewest people
        this hour needs.
      </p>
      <p className="px-(--page) pb-4 text-second text-ink2 desk:absolute desk:bottom-[77%] desk:left-[63%] desk:p-0">
        <strong className="font-[660] text-ink">Hatched is short.</strong> Somebody is still missing
        here.
      </p>
      <svg
        viewBox="0 0 1440 300"
        preserveAspectRatio="xMinYMax slice"
        className="block h-auto min-h-40 w-full"
        aria-hidden="true"
      >
        <Patterns />
        <path className="fill-stone" d={`${line}V300H0Z`} />
        <path fill="url(#wall-bricks)" d={`${line}V300H0Z`} />
        <path className="fill-paper" d={gaps} />
        <path fill="url(#wall-hatch)" className="stroke-short" strokeWidth="1.5" d={gaps} />
        <path className="fill-none stroke-ink" strokeWidth="8" d={line} />
        <path className="stroke-ink2 phone:hidden" strokeWidth="1.25" d="M128 42V158M912 74V204" />
      </svg>
    </aside>
  );
}

/** Courses are 28 high; treads are long and of unequal length, so that it reads as a line. */
const line = 'M-8 188H90V160H392V132H610V160H860V188H1068V160H1290V188H1448';
const gaps = 'M864 192H960V216H864ZM1294 192H1372V216H1294Z';

function Patterns() {
  return (
    <defs>
      <pattern id="wall-bricks" width="68" height="56" patternUnits="userSpaceOnUse" y="20">
        <path
          className="fill-none stroke-paper"
          strokeWidth="1"
          d="M0 .5H68M0 28.5H68M.5 0V28M34.5 28V56"
        />
      </pattern>
      <pattern
        id="wall-hatch"
        width="9"
        height="9"
        patternUnits="userSpaceOnUse"
        patternTransform="rotate(45)"
      >
        <path className="stroke-short" strokeWidth="1.5" d="M.75 0V9" />
      </pattern>
    </defs>
  );
}
