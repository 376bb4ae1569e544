"use client";
import { useState } from "react";
import { Moment } from "@/components/office/moments";
import { RIGHT_WORDS } from "@/components/office/member-rights";
import { RoleTable } from "@/components/office/role-table";
import { Button } from "@/components/ui/button";
import { Dialog } from "@/components/ui/dialog";
import { PaneHead } from "@/components/ui/table";
import type { Bay } from "@/lib/schemas/bay";
import type { Grant, Member } from "@/lib/schemas/member";

type MemberPaneProps = Readonly<{
  member: Member;
  bays: readonly Bay[];
  /** The asker's own membership cannot be suspended by themselves. */
  self: boolean;
  atWork: boolean;
  onSuspend: (suspended: boolean) => void;
}>;

const bayName = (bays: readonly Bay[], bayId: string | null) =>
  bayId === null ? "all bays" : (bays.find((bay) => bay.id === bayId)?.name ?? "a deleted bay");

const GrantLine = ({ grant, bays }: { grant: Grant; bays: readonly Bay[] }) => (
  <li>
    {bayName(bays, grant.bayId)}: {RIGHT_WORDS[grant.right]}
    <span className="block text-note text-ink-3">
      granted by {grant.grantedBy.name}, <Moment at={grant.at} show="day" />
      {grant.until && (
        <>
          , until <Moment at={grant.until} show="day" />
        </>
      )}
    </span>
  </li>
);

/** One member: who, how they stand, what was granted beside the role, and what the role gives. */
export function MemberPane({ member, bays, self, atWork, onSuspend }: MemberPaneProps) {
  const [asking, setAsking] = useState(false);
  const suspended = member.suspendedAt !== null;
  return (
    <section
      aria-label={member.name}
      className="flex min-h-0 min-w-0 flex-col overflow-auto border-l border-frame max-lg:border-t max-lg:border-l-0"
    >
      <PaneHead>
        <h2 className="font-bold">{member.name}</h2>
        <span className="text-note font-regular text-ink-3">
          {member.role} since <Moment at={member.createdAt} show="day" />
        </span>
      </PaneHead>
      <dl className="grid grid-cols-[132px_minmax(0,1fr)] gap-x-2 px-3 py-2 text-[13.5px] leading-[25px] [&_dt]:text-ink-2">
        <dt>E-mail</dt>
        <dd className="truncate">{member.email}</dd>
        <dt>Signed in on</dt>
        <dd>{member.openSessions === 1 ? "1 computer" : `${member.openSessions} computers`}</dd>
        <dt>Granted beside role</dt>
        <dd className="leading-5">
          {member.grants.length === 0 ? (
            "nothing"
          ) : (
            <ul className="py-[3px]">
              {member.grants.map((grant) => (
                <GrantLine key={grant.bayId ?? "all"} grant={grant} bays={bays} />
              ))}
            </ul>
          )}
        </dd>
      </dl>
      <PaneHead className="border-t">
        <h3>What the role gives</h3>
      </PaneHead>
      <RoleTable current={member.role} />
      <div className="mt-auto flex flex-wrap gap-2 border-t border-frame p-3">
        <Button
          className="flex-1"
          atWork={atWork}
          disabled={self}
          title={self ? "Another admin can suspend you." : undefined}
          onClick={() => (suspended ? onSuspend(false) : setAsking(true))}
        >
          {suspended ? "Restore" : "Suspend"}
        </Button>
      </div>
      <Dialog
        open={asking}
        onOpenChange={setAsking}
        title={`Suspend ${member.name}?`}
        text="They are signed out at once and cannot sign in again until an admin restores them. What they made stays."
        actions={
          <Button
            kind="danger"
            onClick={() => {
              setAsking(false);
              onSuspend(true);
            }}
          >
            Suspend
          </Button>
        }
      />
    </section>
  );
}
