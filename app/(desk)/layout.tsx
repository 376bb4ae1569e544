import type { ReactNode } from "react";
import { DeskProviders } from "@/app/(desk)/desk-providers";
import { Desk } from "@/components/sheet/desk";
import { Strip } from "@/components/sheet/strip";
import { pageContextOrNull } from "@/lib/http/page-context";
import { showMe } from "@/lib/services/me/show";
import { displayOf } from "@/app/(desk)/display-of";

/** The bench around every sheet. It shows who is here; each page asks for the actor itself. */
export default async function DeskLayout({ children }: Readonly<{ children: ReactNode }>) {
  const ctx = await pageContextOrNull();
  if (ctx === null) return children;
  const me = await showMe({ ctx });
  return (
    <DeskProviders display={displayOf(me)}>
      <Desk>
        <Strip firm={me.organisation.name} person={{ name: me.user.name, role: me.role }} />
        {children}
      </Desk>
    </DeskProviders>
  );
}
