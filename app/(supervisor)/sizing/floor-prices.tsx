import { clockRange } from '@/app/_ui/clock';
import { SectionHead } from '@/app/_ui/section-head';
import { Table } from '@/app/_ui/table';
import type { Skill } from '@/modules/people';
import type { Sizing } from '@/modules/sizing';
import { weekdayNames } from '@/modules/units';
import { skillName } from './skill-name';

interface Props {
  readonly sizing: Sizing;
  readonly skills: readonly Skill[];
  /** Writes a price with its unit. */
  readonly format: (value: number) => string;
}

/** What one person more on each floor would cost, window by window. */
export function FloorPrices({ sizing, skills, format }: Props) {
  const { answer, problem } = sizing;
  return (
    <section className="min-w-0">
      <SectionHead>What one more costs on each floor</SectionHead>
      <p className="mb-2 text-second text-ink2">
        From the linear relaxation: an estimate for whole people. Where seated floors of one skill
        overlap, their people add up and the overlap has a row of its own.
      </p>
      <Table label="What one more costs on each floor" maxHeight="32rem">
        <thead>
          <tr>
            <th scope="col">Window</th>
            <th scope="col">Skill</th>
            <th scope="col" data-figure>
              People
            </th>
            <th scope="col" data-figure>
              One more costs
            </th>
          </tr>
        </thead>
        <tbody>
          {problem.floors.map((floor, index) => (
            <tr key={`${floor.floorId} ${floor.startMinute}`}>
              <th scope="row" className="whitespace-nowrap">
                {weekdayNames[floor.weekday]}{' '}
                <span className="figures font-normal">
                  {clockRange(floor.startMinute, floor.endMinute)}
                </span>
              </th>
              <td>{skillName(floor.skillId, skills, 'Anybody')}</td>
              <td data-figure>{floor.people}</td>
              <td data-figure>{format(answer.floorPrices[index]?.price ?? 0)}</td>
            </tr>
          ))}
        </tbody>
      </Table>
    </section>
  );
}
