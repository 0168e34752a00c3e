import { Button } from '@/app/_ui/button';
import { SelectField } from '@/app/_ui/field';
import type { TeamInfo } from '@/modules/access';

interface Props {
  readonly teams: readonly TeamInfo[];
  readonly team: TeamInfo;
}

/** The team of an address like `?team=tea_1`, or the first; undefined without teams. */
export const chooseTeam = (
  teams: readonly TeamInfo[],
  asked: string | readonly string[] | undefined,
): TeamInfo | undefined => teams.find(({ id }) => id === asked) ?? teams[0];

/** Changes the team that a sheet shows; nothing for people with one team. */
export function TeamChoice({ teams, team }: Props) {
  if (teams.length < 2) return null;
  return (
    <form method="get" className="flex items-end gap-2 pb-2" data-print="off">
      <SelectField label="Team" name="team" defaultValue={team.id} className="w-56">
        {teams.map(({ id, name }) => (
          <option key={id} value={id}>
            {name}
          </option>
        ))}
      </SelectField>
      <Button type="submit" className="min-h-9!">
        Show
      </Button>
    </form>
  );
}
