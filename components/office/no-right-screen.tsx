import { RIGHT_WORDS } from "@/components/office/member-rights";
import { Sheet } from "@/components/sheet/sheet";
import { Cell, TitleBlock } from "@/components/sheet/title-block";
import { RightSquare } from "@/components/ui/signs";
import { Table, Td, Th } from "@/components/ui/table";
import type { BayList } from "@/lib/schemas/bay";

type NoRightScreenProps = Readonly<{ name: string; role: string; firm: string; bays: BayList }>;

/** For whom the Office is closed: what they may do, and who can do the rest. */
export const NoRightScreen = ({ name, role, firm, bays }: NoRightScreenProps) => (
  <Sheet
    heading="Office"
    block={
      <TitleBlock>
        <Cell label="Office" big>
          Your rights
        </Cell>
        <Cell label="Firm" fill stays="md">
          {firm}
        </Cell>
        <Cell label="Role">{role}</Cell>
      </TitleBlock>
    }
  >
    <div className="grid max-w-2xl gap-4 p-4">
      <p>
        <b>The Office is for admins.</b>{" "}
        <span className="text-ink-2">
          {name}, you are {/^[aeio]/.test(role) ? "an" : "a"} {role}. Below is what you may do in each bay; an
          admin of {firm} can raise it.
        </span>
      </p>
      <Table>
        <thead>
          <tr>
            <Th>Bay</Th>
            <Th>Your right</Th>
          </tr>
        </thead>
        <tbody>
          {bays.items.map((bay) => (
            <tr key={bay.id}>
              <Td>
                <b className="mr-2 font-num">{bay.ordinal}</b>
                {bay.name}
              </Td>
              <Td>
                <RightSquare level={bay.right} /> <span className="ml-1">{RIGHT_WORDS[bay.right]}</span>
              </Td>
            </tr>
          ))}
        </tbody>
      </Table>
    </div>
  </Sheet>
);
