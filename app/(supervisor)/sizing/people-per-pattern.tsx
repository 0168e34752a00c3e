import { SectionHead } from '@/app/_ui/section-head';
import { Table } from '@/app/_ui/table';
import type { Skill } from '@/modules/people';
import type { Sizing } from '@/modules/sizing';
import { formatPay } from './format-value';
import { skillName } from './skill-name';

interface Props {
  readonly sizing: Sizing;
  readonly skills: readonly Skill[];
  readonly currency: string;
}

/** People on each pattern of the whole-number answer. */
export function PeoplePerPattern({ sizing, skills, currency }: Props) {
  const { answer, problem } = sizing;
  const rows = answer.people.flatMap(({ patternId, count }) => {
    const pattern = problem.patterns.find(({ id }) => id === patternId);
    return pattern ? [{ pattern, count }] : [];
  });
  return (
    <section className="min-w-0">
      <SectionHead>People per pattern</SectionHead>
      <p className="mb-2 text-second text-ink2">
        Other splits may be as good; patterns without people are left out.
      </p>
      <Table label="People per pattern">
        <thead>
          <tr>
            <th scope="col">Pattern</th>
            <th scope="col">Skill</th>
            <th scope="col" data-figure>
              People
            </th>
            <th scope="col" data-figure>
              Pay
            </th>
          </tr>
        </thead>
        <tbody>
          {rows.map(({ pattern, count }) => (
            <tr key={pattern.id}>
              <th scope="row">{pattern.label}</th>
              <td>{skillName(pattern.skillId, skills, 'None')}</td>
              <td data-figure>{count}</td>
              <td data-figure>{formatPay(count * pattern.costCents, currency)}</td>
            </tr>
          ))}
        </tbody>
        <tfoot>
          <tr>
            <th scope="row" colSpan={2}>
              Together
            </th>
            <td data-figure>{rows.reduce((sum, { count }) => sum + count, 0)}</td>
            <td data-figure>
              {formatPay(
                rows.reduce((sum, { pattern, count }) => sum + count * pattern.costCents, 0),
                currency,
              )}
            </td>
          </tr>
        </tfoot>
      </Table>
    </section>
  );
}
