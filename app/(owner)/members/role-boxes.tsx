import { CheckField } from '@/app/_ui/check-field';
import type { RoleGroup } from './role-choices';

interface Props {
  readonly groups: readonly RoleGroup[];
  /** Keys of the ticked boxes. */
  readonly keys: readonly string[];
  readonly onTick: (key: string, isTicked: boolean) => void;
}

/** One box for each role, grouped by the part of the organisation it counts in. */
export function RoleBoxes({ groups, keys, onTick }: Props) {
  return groups.map(({ name, choices }) => (
    <fieldset key={name} className="mt-3">
      <legend className="text-second font-[640]">{name}</legend>
      <div className="flex flex-wrap gap-x-6">
        {choices.map(({ key, label }) => (
          <CheckField
            key={key}
            label={label}
            checked={keys.includes(key)}
            onChange={(event) => onTick(key, event.target.checked)}
          />
        ))}
      </div>
    </fieldset>
  ));
}
