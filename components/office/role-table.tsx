import { RIGHT_OF_ROLE } from "@/lib/permissions";
import { ROLES, type Role } from "@/lib/schemas/access";
import { cx } from "@/components/ui/cx";
import { AcceptedSign, RightSquare } from "@/components/ui/signs";
import { Table, Td, Th } from "@/components/ui/table";

const WORD = { read: "read", draft: "draft", release: "release" } as const;

const GIVES: readonly Readonly<{ what: string; roles: readonly Role[] }>[] = [
  {
    what: "Search, compare, open, export released shapes; draw on the Bench, keep private drawings",
    roles: ROLES,
  },
  {
    what: "Put a delivery away or return it, manage bays and stock plates, edit tabulated shapes",
    roles: ["librarian", "admin"],
  },
  { what: "Members, roles, rights, settings, the log", roles: ["admin"] },
];

const CELL = "h-auto! px-1.5! py-1.5 text-center whitespace-normal!";
const WHAT = "h-auto! w-[176px] py-1.5 pl-3! leading-4 whitespace-normal! text-ink-2";

const Given = ({ what, roles, current }: (typeof GIVES)[number] & { current: Role }) => (
  <tr>
    <Td className={WHAT}>{what}</Td>
    {ROLES.map((role) => (
      <Td key={role} className={cx(CELL, role === current && "bg-wash")}>
        {roles.includes(role) ? <AcceptedSign label="yes" /> : <span className="text-ink-3">no</span>}
      </Td>
    ))}
  </tr>
);

/** What each role gives, with the member's own column washed. */
export const RoleTable = ({ current }: { current: Role }) => (
  <Table>
    <thead>
      <tr>
        <Th>
          <span className="sr-only">What</span>
        </Th>
        {ROLES.map((role) => (
          <Th
            key={role}
            className={cx("px-1.5! text-center!", role === current && "bg-wash font-[640] text-ink!")}
          >
            {role}
          </Th>
        ))}
      </tr>
    </thead>
    <tbody>
      <Given {...GIVES[0]!} current={current} />
      <tr>
        <Td className={WHAT}>Right in bays unless granted otherwise</Td>
        {ROLES.map((role) => (
          <Td key={role} className={cx(CELL, role === current && "bg-wash")}>
            <RightSquare level={RIGHT_OF_ROLE[role]} />
            <small className="mt-[3px] block text-micro leading-[13px] text-ink-2">
              {WORD[RIGHT_OF_ROLE[role]]}
            </small>
          </Td>
        ))}
      </tr>
      {GIVES.slice(1).map((row) => (
        <Given key={row.what} {...row} current={current} />
      ))}
    </tbody>
  </Table>
);
