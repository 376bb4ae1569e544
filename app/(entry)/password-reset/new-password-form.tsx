"use client";
import Link from "next/link";
import { useState, type FormEvent } from "react";
import { EntryBlock, EntryFact, EntryField } from "@/components/entry/entry-block";
import { PASSWORD_RULE, passwordFault } from "@/components/entry/password-rule";
import { api, ApiProblem, sentenceOf } from "@/lib/client/api";

type NewPasswordFormProps = Readonly<{ token: string }>;

const REFUSED = "new-password-refused";

const linkIsOver = (cause: unknown): boolean =>
  cause instanceof ApiProblem && (cause.status === 404 || cause.issueAt("/token") !== null);

/** Sets a new password with the link of a letter. */
export function NewPasswordForm({ token }: NewPasswordFormProps) {
  const [password, setPassword] = useState("");
  const [refused, setRefused] = useState<string | null>(null);
  const [state, setState] = useState<"open" | "atWork" | "over" | "done">("open");

  const complete = async (event: FormEvent) => {
    event.preventDefault();
    if (state === "atWork") return;
    const fault = passwordFault(password);
    setRefused(fault);
    if (fault) return;
    setState("atWork");
    try {
      await api.post("/password-resets/complete", { body: { token, password } });
      setState("done");
    } catch (cause) {
      setState(linkIsOver(cause) ? "over" : "open");
      setRefused(sentenceOf(cause));
    }
  };

  const beside = (
    <EntryFact label="Password" right>
      {state === "done" ? "changed" : "Choose a new one"}
    </EntryFact>
  );
  if (state === "done") {
    return (
      <EntryBlock
        beside={beside}
        refusedId={REFUSED}
        refused={null}
        word={
          <>
            The new password counts from now on.{" "}
            <Link href="/sign-in" className="link">
              Sign in with it
            </Link>
          </>
        }
      />
    );
  }
  return (
    <EntryBlock
      beside={beside}
      refusedId={REFUSED}
      refused={
        state === "over" ? (
          <>
            This link does not hold: it was used, is older than an hour, or was not copied whole. Nothing was
            changed.{" "}
            <Link href="/password-reset" className="link">
              Ask for a new letter
            </Link>
          </>
        ) : (
          refused
        )
      }
      action="Set the password"
      atWork={state === "atWork"}
      onSubmit={complete}
    >
      <div className="col-span-full grid">
        <EntryField
          label="New password"
          type="password"
          name="password"
          autoComplete="new-password"
          autoFocus
          required
          note={PASSWORD_RULE}
          value={password}
          onChange={(event) => setPassword(event.target.value)}
          refused={refused !== null && state !== "over"}
          refusedId={REFUSED}
        />
      </div>
    </EntryBlock>
  );
}
