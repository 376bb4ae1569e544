"use client";
import { useRef, useState, type KeyboardEvent } from "react";
import { RightCell, type RightWish } from "@/components/office/right-cell";
import { agoWords } from "@/components/office/moments";
import { Select } from "@/components/ui/select";
import { Table, Td, Th, Tr } from "@/components/ui/table";
import { ROLES, type Role } from "@/lib/schemas/access";
import type { Bay } from "@/lib/schemas/bay";
import type { Member } from "@/lib/schemas/member";

const ROLE_CHOICES = ROLES.map((role) => ({ value: role, label: role }));

type MemberMatrixProps = Readonly<{
  members: readonly Member[];
  bays: readonly Bay[];
  now: number;
  inHand: string | null;
  onTake: (memberId: string) => void;
  onRole: (member: Member, role: Role) => void;
  onWish: (member: Member, wish: RightWish) => void;
}>;

const STEP: Record<string, readonly [row: number, column: number]> = {
  ArrowUp: [-1, 0],
  ArrowDown: [1, 0],
  ArrowLeft: [0, -1],
  ArrowRight: [0, 1],
};

/** Members by bays: the role, and in each bay the right that counts. Arrows move among the squares. */
export function MemberMatrix({ members, bays, now, inHand, onTake, onRole, onWish }: MemberMatrixProps) {
  const body = useRef<HTMLTableSectionElement>(null);
  const [stop, setStop] = useState<readonly [number, number]>([0, 0]);

  const onKeyDown = (event: KeyboardEvent<HTMLTableSectionElement>) => {
    const step = STEP[event.key];
    const on = event.target instanceof HTMLElement && event.target.hasAttribute("data-right-cell");
    if (!step || !on) return;
    event.preventDefault();
    const row = Math.min(members.length - 1, Math.max(0, stop[0] + step[0]));
    const column = Math.min(bays.length - 1, Math.max(0, stop[1] + step[1]));
    const cells = body.current?.querySelectorAll<HTMLButtonElement>("[data-right-cell]");
    cells?.[row * bays.length + column]?.focus();
  };

  return (
    <Table>
      <caption className="sr-only">Members, their roles and their rights in each bay</caption>
      <thead>
        <tr>
          <Th rowSpan={2} className="sticky left-0 z-[1] bg-sheet pl-3.5!">
            Member
          </Th>
          <Th rowSpan={2}>Role</Th>
          {bays.length > 0 && (
            <th
              colSpan={bays.length}
              scope="colgroup"
              className="h-[22px] border-b border-rule text-center font-medium text-ink-2"
            >
              Rights in each bay
            </th>
          )}
          <Th rowSpan={2} numeric className="max-lg:hidden">
            Sessions
          </Th>
          <Th rowSpan={2}>Last here</Th>
        </tr>
        <tr>
          {bays.map((bay) => (
            <Th
              key={bay.id}
              className="h-11! w-[68px] px-0.5! pt-[3px] pb-1! text-center! align-top! leading-[13px] whitespace-normal!"
            >
              <b className="block font-num leading-4 text-ink">{bay.ordinal}</b>
              <span className="text-micro">{bay.name}</span>
            </Th>
          ))}
        </tr>
      </thead>
      <tbody ref={body} onKeyDown={onKeyDown}>
        {members.map((member, row) => (
          <Tr key={member.id} inHand={member.id === inHand}>
            <Td className="sticky left-0 z-[1] h-[34px]! bg-sheet pl-3.5!">
              <button
                type="button"
                aria-pressed={member.id === inHand}
                onClick={() => onTake(member.id)}
                className="min-h-6 font-bold hover:underline max-md:min-h-11"
              >
                {member.name}
              </button>
              {member.suspendedAt && (
                <span className="ml-2 border border-dashed border-edge px-1.5 text-note text-ink-2">
                  suspended
                </span>
              )}
            </Td>
            <Td>
              <Select
                aria-label={`Role of ${member.name}`}
                value={member.role}
                choices={ROLE_CHOICES}
                onChange={(role) => onRole(member, role)}
                className="w-28"
              />
            </Td>
            {bays.map((bay, column) => (
              <Td key={bay.id} className="border-l border-rule px-0! text-center">
                <RightCell
                  member={member}
                  bay={bay}
                  now={now}
                  tabIndex={stop[0] === row && stop[1] === column ? 0 : -1}
                  onFocus={() => {
                    setStop([row, column]);
                    onTake(member.id);
                  }}
                  onWish={(wish) => onWish(member, wish)}
                />
              </Td>
            ))}
            <Td numeric className="border-l border-rule max-lg:hidden">
              {member.openSessions}
            </Td>
            <Td className="text-ink-2">{agoWords(member.lastSeenAt, now)}</Td>
          </Tr>
        ))}
      </tbody>
    </Table>
  );
}
