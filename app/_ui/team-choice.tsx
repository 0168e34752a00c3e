'use client';

import { usePathname, useRouter } from 'next/navigation';
import { SelectField } from './field';

interface Props {
  readonly teams: readonly { readonly id: string; readonly name: string }[];
  readonly teamId: string;
}

/** Chooses the team of a sheet; nothing is drawn for people with one team. */
export function TeamChoice({ teams, teamId }: Props) {
  const router = useRouter();
  const pathname = usePathname();
  if (teams.length < 2) return null;
  return (
    <SelectField
      label="Team"
      value={teamId}
      onChange={(event) => router.push(`${pathname}?team=${event.target.value}`)}
    >
      {teams.map(({ id, name }) => (
        <option key={id} value={id}>
          {name}
        </option>
      ))}
    </SelectField>
  );
}
