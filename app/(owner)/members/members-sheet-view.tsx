'use client';

import { useState } from 'react';
import { TextField } from '@/app/_ui/field';
import { TitleBlock } from '@/app/_ui/title-block';
import { Verdict } from '@/app/_ui/verdict';
import type { Member } from '@/modules/access';
import type { UserId } from '@/modules/units';
import { findMembers } from './find-members';
import { MembersTable } from './members-table';
import { roleGroups, type TeamName } from './role-choices';
import { useMemberChanges } from './use-member-changes';

interface Props {
  readonly members: readonly Member[];
  readonly teams: readonly TeamName[];
  readonly organisationName: string;
  readonly ownUserId: UserId;
}

/** The members sheet: who has an account, what they may do, and whether they may sign in. */
export function MembersSheetView({ members: atFirst, teams, organisationName, ownUserId }: Props) {
  const { members, changing } = useMemberChanges(atFirst, ownUserId);
  const [search, setSearch] = useState('');
  const found = findMembers(members, search);
  const groups = roleGroups(teams);
  const isOwner = ({ memberships, isDisabled }: Member) =>
    !isDisabled && memberships.some(({ role }) => role === 'owner');
  return (
    <>
      <Verdict
        lead={`Who has an account at ${organisationName} and what they may do. A change counts from the member’s next request on.`}
      >
        Members
      </Verdict>
      <TextField
        label="Find by name or e-mail"
        type="search"
        value={search}
        onChange={(event) => setSearch(event.target.value)}
        className="mb-3 max-w-80"
      />
      <p role="status" className="mb-1 text-second text-ink2">
        {search.trim() === '' ? null : `${found.length} of ${members.length} members`}
      </p>
      <MembersTable
        members={found}
        groups={groups}
        ownUserId={ownUserId}
        onChange={changing.mutateAsync}
      />
      <TitleBlock
        figures={[
          { label: 'Members', value: members.length },
          { label: 'Disabled', value: members.filter(({ isDisabled }) => isDisabled).length },
          { label: 'Owners', value: members.filter(isOwner).length },
          { label: 'Teams', value: teams.length },
        ]}
      />
    </>
  );
}
