import { Button } from './button';
import { SelectField } from './field';

interface Props {
  readonly teams: readonly { readonly id: string; readonly name: string }[];
  readonly teamId: string;
}

/** Changes the team that a sheet shows; nothing is drawn for people with one team. */
export function TeamChoice({ teams, teamId }: Props) {
  if (teams.length < 2) return null;
  return (
    <form method="get" className="flex items-end gap-2 pb-2" data-print="off">
      <SelectField label="Team" name="team" defaultValue={teamId} className="w-56">
        {teams.map(({ id, name }) => (
          <option key={id} value={id}>
            {name}
          </option>
        ))}
      </SelectField>
      <Button type="submit" className="min-h-9! phone:min-h-11!">
        Show
      </Button>
    </form>
  );
}
