import { useMutation, useQuery, useQueryClient } from '@tanstack/react-query';
import { useRouter } from 'next/navigation';
import { callApi } from '@/app/_api';
import { useAnnounce } from '@/app/_ui/live-region';
import type { Member, MemberChange } from '@/modules/access';
import type { UserId } from '@/modules/units';

export interface MemberChangeOf {
  readonly userId: UserId;
  readonly change: MemberChange;
  /** What is read aloud once it is done. */
  readonly done: string;
}

/** The members, and the one way to change one. Changes of one's own account open the page again. */
export function useMemberChanges(atFirst: readonly Member[], ownUserId: UserId) {
  const queries = useQueryClient();
  const router = useRouter();
  const announce = useAnnounce();
  const { data: members } = useQuery({
    queryKey: ['members'],
    queryFn: () => callApi<Member[]>('GET', 'members'),
    initialData: [...atFirst],
  });
  const changing = useMutation({
    mutationFn: ({ userId, change }: MemberChangeOf) =>
      callApi<Member>('PATCH', `members/${userId}`, change),
    onSuccess: (changed, { done }) => {
      queries.setQueryData<Member[]>(['members'], (known = []) =>
        known.map((member) => (member.userId === changed.userId ? changed : member)),
      );
      announce(done);
      if (changed.userId === ownUserId) router.refresh();
    },
  });
  return { members, changing };
}
