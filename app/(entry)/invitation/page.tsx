import type { Metadata } from "next";
import Link from "next/link";
import { InvitationForm } from "@/app/(entry)/invitation/form";
import { EntryBlock, EntryFact } from "@/components/entry/entry-block";
import { EntrySheet } from "@/components/entry/entry-sheet";
import { AppError } from "@/lib/errors";
import { openPageContext } from "@/lib/http/page-context";
import type { ShownInvitation } from "@/lib/schemas/invitation";
import { showInvitation } from "@/lib/services/invitation/show";

export const metadata: Metadata = { title: "Invitation", referrer: "no-referrer" };

type InvitationProps = Readonly<{
  searchParams: Promise<Readonly<Record<string, string | string[] | undefined>>>;
}>;

/** The invitation as it stands; null when the link does not hold. Reading it changes nothing. */
const invitationOf = async (token: string): Promise<ShownInvitation | null> => {
  try {
    return await showInvitation({ ctx: await openPageContext(), input: { token } });
  } catch (error) {
    if (error instanceof AppError && (error.code === "notFound" || error.code === "invalid")) return null;
    throw error;
  }
};

export default async function InvitationPage({ searchParams }: InvitationProps) {
  const { token } = await searchParams;
  const secret = typeof token === "string" ? token : "";
  const shown = await invitationOf(secret);
  if (shown === null) {
    return (
      <EntrySheet
        heading="This invitation no longer holds"
        block={
          <EntryBlock
            beside={
              <EntryFact label="Invitation" right>
                no longer holds
              </EntryFact>
            }
            refusedId="invitation-refused"
            refused="This link does not hold: it was used, taken back, replaced by a newer one, is older than 72 hours, or was not copied whole."
          />
        }
        notes={
          <>
            <li>
              Accepted it already?{" "}
              <Link href="/sign-in" className="link">
                Sign in
              </Link>{" "}
              with the address it was sent to.
            </li>
            <li>Several letters? Only the link of the newest holds.</li>
            <li>
              Otherwise ask the person who invited you for a new one; an admin sends it from the Office.
            </li>
          </>
        }
      />
    );
  }
  return (
    <EntrySheet
      heading={`Invitation to ${shown.organisation}`}
      block={<InvitationForm token={secret} shown={shown} />}
      notes={
        <>
          <li>
            {shown.invitedBy || "An admin"} invites you to the book of cross-sections of {shown.organisation},
            as {shown.role}.
          </li>
          <li>
            Nothing is accepted until you press the button. If you do not know the sender, close this page.
          </li>
          {shown.known ? (
            <li>
              You have an account with this address already. Give its password: {shown.organisation} is added
              to it, and the rest stays as it is.{" "}
              <Link href="/password-reset" className="link">
                Forgotten password?
              </Link>
            </li>
          ) : (
            <li>The password is yours alone; nobody in the firm can see it.</li>
          )}
        </>
      }
    />
  );
}
