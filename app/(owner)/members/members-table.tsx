import { Table } from '@/app/_ui/table';
import type { Member } from '@/modules/access';
import type { UserId } from '@/modules/units';
import { MemberRow } from './member-row';
import type { RoleGroup } from './role-choices';
import type { MemberChangeOf } from './use-member-changes';

interface Props {
  readonly members: readonly Member[];
  readonly groups: readonly RoleGroup[];
  readonly ownUserId: UserId;
  readonly onChange: (change: MemberChangeOf) => Promise<unknown>;
}

/** One row for each account. On phones e-mail and state stand with name and roles. */
export function MembersTable({ members, groups, ownUserId, onChange }: Props) {
  return (
    <Table label="Members" holdsFirstColumn={false}>
      <thead>
        <tr>
          <th scope="col">Name</th>
          <th scope="col" className="phone:hidden">
            E-mail
          </th>
          <th scope="col">Roles</th>
          <th scope="col" className="phone:hidden">
            State
          </th>
          <th scope="col">Change</th>
        </tr>
      </thead>
      <tbody>
        {members.map((member) => (
          <MemberRow
            key={member.userId}
            member={member}
            groups={groups}
            isOwn={member.userId === ownUserId}
            onChange={onChange}
          />
        ))}
      </tbody>
    </Table>
  );
}
