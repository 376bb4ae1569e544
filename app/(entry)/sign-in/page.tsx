import type { Metadata } from "next";
import Link from "next/link";
import { DEMO } from "@/app/(entry)/sign-in/demo";
import { SignInForm } from "@/app/(entry)/sign-in/form";
import { wantedPath } from "@/app/(entry)/sign-in/wanted-path";
import { EntrySheet } from "@/components/entry/entry-sheet";
import { isDemo } from "@/lib/env";

export const metadata: Metadata = { title: "Sign in" };

type SignInProps = Readonly<{
  searchParams: Promise<Readonly<Record<string, string | string[] | undefined>>>;
}>;

export default async function SignInPage({ searchParams }: SignInProps) {
  const { next } = await searchParams;
  const demo = isDemo() ? DEMO : null;
  return (
    <EntrySheet
      heading="Sign in to Flitchbook"
      block={<SignInForm firm={demo?.firm ?? null} people={demo?.people ?? []} wanted={wantedPath(next)} />}
      notes={
        <>
          <li>
            This is the section book of {demo?.firm ?? "your firm"}. Each sheet says what was checked and what
            was not.
          </li>
          <li>No account yet? An admin in the Office makes one.</li>
          <li>
            <Link href="/password-reset" className="link">
              Forgotten password
            </Link>
            : ask for a letter with a link; it lasts an hour.
          </li>
          {demo && (
            <li>
              This is the demo: sign in as {demo.people.map((p) => p.email.split("@")[0]).join(", ")} with the
              password <b className="font-num text-ink select-all">{demo.password}</b>. Its firm, people and
              figures are invented.
            </li>
          )}
        </>
      }
    />
  );
}
