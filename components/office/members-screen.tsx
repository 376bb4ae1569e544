"use client";
import Link from "next/link";
import { useQuery } from "@tanstack/react-query";
import { parseAsString, useQueryStates } from "nuqs";
import { LogTable } from "@/components/office/log-table";
import { MemberMatrix } from "@/components/office/member-matrix";
import { MemberPane } from "@/components/office/member-pane";
import { Moment } from "@/components/office/moments";
import { officeKeys } from "@/components/office/office-keys";
import { OfficeNav, type OfficePage } from "@/components/office/office-nav";
import { useMemberChanges } from "@/components/office/use-member-changes";
import { ScrollAcross } from "@/components/office/scroll-across";
import { Sheet } from "@/components/sheet/sheet";
import { Cell, TitleBlock } from "@/components/sheet/title-block";
import { Notice } from "@/components/ui/notice";
import { RightSquare } from "@/components/ui/signs";
import { PaneHead } from "@/components/ui/table";
import { fieldClass } from "@/components/ui/field";
import { cx } from "@/components/ui/cx";
import { api, sentenceOf } from "@/lib/client/api";
import type { BayList } from "@/lib/schemas/bay";
import type { LogPage } from "@/lib/schemas/log";
import type { Member, MemberList } from "@/lib/schemas/member";

type MembersScreenProps = Readonly<{
  pages: readonly OfficePage[];
  firm: string;
  self: string;
  now: number;
  members: MemberList;
  bays: BayList;
  log: LogPage;
}>;

const RECENT = { limit: 10 } as const;
const fits = (member: Member, q: string) =>
  `${member.name} ${member.email} ${member.role}`.toLowerCase().includes(q.trim().toLowerCase());

/** Members, roles and rights by bay, with the newest deeds below and the member in hand beside. */
export function MembersScreen(props: MembersScreenProps) {
  const { pages, firm, self, now } = props;
  const [{ member: wanted, q }, setAddress] = useQueryStates({
    member: parseAsString,
    q: parseAsString.withDefault(""),
  });
  const { data: members } = useQuery({
    queryKey: officeKeys.members(),
    queryFn: async ({ signal }) => (await api.get<MemberList>("/members", { signal })).data,
    initialData: props.members,
  });
  const { data: log } = useQuery({
    queryKey: officeKeys.log(RECENT),
    queryFn: async ({ signal }) => (await api.get<LogPage>("/log", { query: RECENT, signal })).data,
    initialData: props.log,
  });
  const { right, update } = useMemberChanges(now);
  const bays = props.bays.items;
  const shown = members.items.filter((member) => fits(member, q));
  const inHand = shown.find((member) => member.id === wanted) ?? shown[0] ?? null;
  const granted = members.items.reduce((sum, member) => sum + member.grants.length, 0);
  const failure = right.error ?? update.error;
  const newest = log.items[0];

  const block = (
    <TitleBlock>
      <Cell label="Office" big>
        Members
      </Cell>
      <Cell label="Firm" fill stays="md">
        {firm}
      </Cell>
      <Cell label="Members">{members.items.length}</Cell>
      <Cell label="Granted beside the role" stays="md">
        {granted}
      </Cell>
      <Cell label="Last deed" stays="lg">
        {newest ? (
          <>
            {newest.actor.name}, <Moment at={newest.at} show="both" />
          </>
        ) : (
          "none yet"
        )}
      </Cell>
    </TitleBlock>
  );

  return (
    <Sheet heading="Office: members" block={block}>
      <div className="grid min-h-full grid-cols-[minmax(0,1fr)_412px] max-lg:grid-cols-[minmax(0,1fr)]">
        <div className="flex min-w-0 flex-col">
          <OfficeNav pages={pages}>
            <span className="inline-flex items-center gap-[7px]">
              <RightSquare level="read" /> read
            </span>
            <span className="inline-flex items-center gap-[7px]">
              <RightSquare level="draft" /> draft and submit
            </span>
            <span className="inline-flex items-center gap-[7px]">
              <RightSquare level="release" /> release and withdraw
            </span>
            <span className="inline-flex items-center gap-[7px]">
              <RightSquare level="draft" granted /> granted, not by role
            </span>
            <input
              type="search"
              aria-label="Filter members"
              placeholder="Filter members"
              value={q}
              onChange={(event) => void setAddress({ q: event.target.value || null })}
              className={cx(fieldClass({ set: q !== "" }), "h-7 w-36 max-md:h-11")}
            />
          </OfficeNav>
          {failure && (
            <Notice kind="lost" head="That change was not made." className="border-b border-rule p-3">
              {sentenceOf(failure)}
            </Notice>
          )}
          <ScrollAcross label="Members and rights">
            <MemberMatrix
              members={shown}
              bays={bays}
              now={now}
              inHand={inHand?.id ?? null}
              onTake={(member) => void setAddress({ member })}
              onRole={(member, role) => update.mutate({ member, change: { role } })}
              onWish={(member, wish) => right.mutate({ member, wish })}
            />
            {shown.length === 0 && <p className="p-3.5 text-ink-2">No member fits “{q}”.</p>}
          </ScrollAcross>
          <PaneHead className="border-t">
            <h2>Log</h2>
            <span className="text-note font-regular text-ink-3">every change, for good</span>
            <Link href="/office/log" className="link ml-auto text-table font-regular">
              whole log
            </Link>
          </PaneHead>
          <ScrollAcross label="Newest deeds">
            <LogTable entries={log.items} show="both" />
          </ScrollAcross>
        </div>
        {inHand && (
          <MemberPane
            key={inHand.id}
            member={inHand}
            bays={bays}
            self={inHand.userId === self}
            atWork={update.isPending}
            onSuspend={(suspended) => update.mutate({ member: inHand, change: { suspended } })}
          />
        )}
      </div>
    </Sheet>
  );
}
