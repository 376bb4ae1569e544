import type { Metadata } from "next";
import { DEMO } from "@/app/(entry)/sign-in/demo";
import { SignInForm } from "@/app/(entry)/sign-in/form";
import { wantedPath } from "@/app/(entry)/sign-in/wanted-path";
import { FlitchDrawing } from "@/components/entry/flitch-drawing";
import { ZoneBorder } from "@/components/sheet/sheet";
import { isDemo } from "@/lib/env";

export const metadata: Metadata = { title: "Sign in" };

type SignInProps = Readonly<{
  searchParams: Promise<Readonly<Record<string, string | string[] | undefined>>>;
}>;

export default async function SignInPage({ searchParams }: SignInProps) {
  const { next } = await searchParams;
  const demo = isDemo() ? DEMO : null;
  return (
    <div className="grid min-h-full p-2 max-md:p-0">
      <main className="grid border border-frame bg-sheet max-md:border-x-0">
        <h1 className="sr-only">Sign in to Flitchbook</h1>
        <ZoneBorder>
          <div className="relative grid grid-rows-[1fr_auto] content-between overflow-hidden max-md:grid-rows-1">
            <FlitchDrawing className="mx-auto w-full max-w-[1380px] self-start max-md:hidden" />
            <div className="flex flex-row-reverse items-end justify-between gap-8 max-lg:flex-col max-lg:items-stretch max-lg:gap-4">
              <SignInForm firm={demo?.firm ?? null} people={demo?.people ?? []} wanted={wantedPath(next)} />
              <section className="max-w-[620px] px-6 pt-4 pb-5 text-ink-2">
                <h2 className="font-bold text-ink">Notes</h2>
                <ol className="list-decimal pl-5 leading-[22px]">
                  <li>
                    This is the section book of {demo?.firm ?? "your firm"}. Each sheet says what was checked
                    and what was not.
                  </li>
                  <li>No account yet? An admin in the Office makes one.</li>
                  <li>Forgotten password: ask an admin for a fresh link; it lasts an hour.</li>
                  {demo && (
                    <li>
                      This is the demo: sign in as {demo.people.map((p) => p.email.split("@")[0]).join(", ")}{" "}
                      with the password <b className="font-num text-ink select-all">{demo.password}</b>. Its
                      firm, people and figures are invented.
                    </li>
                  )}
                </ol>
              </section>
            </div>
          </div>
        </ZoneBorder>
      </main>
    </div>
  );
}
