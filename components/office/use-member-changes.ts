"use client";
import { useMutation, useQueryClient } from "@tanstack/react-query";
import { changesFor } from "@/components/office/member-rights";
import type { RightWish } from "@/components/office/right-cell";
import { api } from "@/lib/client/api";
import { officeKeys } from "@/components/office/office-keys";
import type { Member, MemberList, UpdateMemberInput } from "@/lib/schemas/member";

/** Changes to a member: the list and the log are read again after each, whether it succeeded or not. */
export const useMemberChanges = (now: number) => {
  const cache = useQueryClient();
  const settled = () =>
    Promise.all([
      cache.invalidateQueries({ queryKey: officeKeys.members() }),
      cache.invalidateQueries({ queryKey: officeKeys.logs() }),
    ]);

  const right = useMutation({
    mutationFn: async ({ member, wish }: { member: Member; wish: RightWish }) => {
      for (const body of changesFor(member, wish, now)) await api.put("/rights", { body });
    },
    onSettled: settled,
  });

  const update = useMutation({
    mutationFn: async ({ member, change }: { member: Member; change: UpdateMemberInput }) => {
      const { data } = await api.patch<Member>(`/members/${member.id}`, {
        body: change,
        ifMatch: `"${member.version}"`,
      });
      return data;
    },
    onSuccess: (changed) =>
      cache.setQueryData<MemberList>(
        officeKeys.members(),
        (list) =>
          list && { items: list.items.map((member) => (member.id === changed.id ? changed : member)) },
      ),
    onSettled: settled,
  });

  return { right, update };
};
