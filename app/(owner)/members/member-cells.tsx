import type { Member } from '@/modules/access';
import { type RoleGroup, roleLines } from './role-choices';

interface Props {
  readonly member: Member;
  readonly groups: readonly RoleGroup[];
  readonly isOwn: boolean;
}

/** Who it is, the roles, and whether they may sign in. On phones e-mail and state stand with the others. */
export function MemberCells({ member, groups, isOwn }: Props) {
  const { name, email, isDisabled, memberships } = member;
  return (
    <>
      <th scope="row">
        {name}
        {isOwn ? <span className="font-normal text-ink2">, you</span> : null}
        <span className="block text-second font-normal text-ink2 [overflow-wrap:anywhere] desk:hidden">
          {email}
        </span>
      </th>
      <td className="phone:hidden">{email}</td>
      <td>
        {roleLines(memberships, groups).map((line) => (
          <span key={line} className="block desk:whitespace-nowrap">
            {line}
          </span>
        ))}
        {isDisabled ? (
          <span className="block font-[640] text-note desk:hidden">Disabled</span>
        ) : null}
      </td>
      <td className={`phone:hidden ${isDisabled ? 'font-[640] text-note' : 'text-ink2'}`}>
        {isDisabled ? 'Disabled' : 'Active'}
      </td>
    </>
  );
}
