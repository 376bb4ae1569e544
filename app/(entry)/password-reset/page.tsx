import type { Metadata } from "next";
import Link from "next/link";
import { AskForLetterForm } from "@/app/(entry)/password-reset/ask-form";
import { NewPasswordForm } from "@/app/(entry)/password-reset/new-password-form";
import { EntrySheet } from "@/components/entry/entry-sheet";

export const metadata: Metadata = { title: "New password", referrer: "no-referrer" };

type PasswordResetProps = Readonly<{
  searchParams: Promise<Readonly<Record<string, string | string[] | undefined>>>;
}>;

/** Without a token the form that asks for the letter; with the token of a letter the one that sets a password. */
export default async function PasswordResetPage({ searchParams }: PasswordResetProps) {
  const { token } = await searchParams;
  if (typeof token !== "string" || token === "") {
    return (
      <EntrySheet
        heading="Forgotten password"
        block={<AskForLetterForm />}
        notes={
          <>
            <li>A letter with a link goes to the address of your account. The link lasts an hour.</li>
            <li>Your password stays as it is until you choose a new one on that page.</li>
            <li>
              No letter after a few minutes? Look where unwanted mail goes, and whether the address is the one
              of your account; an admin of your firm can tell you.
            </li>
            <li>
              Remembered it?{" "}
              <Link href="/sign-in" className="link">
                Sign in
              </Link>
            </li>
          </>
        }
      />
    );
  }
  return (
    <EntrySheet
      heading="Choose a new password"
      block={<NewPasswordForm token={token} />}
      notes={
        <>
          <li>Nothing changes until you press the button.</li>
          <li>Then every session of yours ends, on all computers, and you sign in with the new password.</li>
          <li>
            The link can be used once and lasts an hour.{" "}
            <Link href="/password-reset" className="link">
              Ask for a new letter
            </Link>
          </li>
        </>
      }
    />
  );
}
