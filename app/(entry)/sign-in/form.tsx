"use client";
import { useRef, useState, type FormEvent } from "react";
import { BrandMark } from "@/components/sheet/brand";
import { Button } from "@/components/ui/button";
import { cx } from "@/components/ui/cx";
import { fieldClass } from "@/components/ui/field";
import { RefusedSign } from "@/components/ui/signs";
import { api, ApiProblem, sentenceOf } from "@/lib/client/api";

type SignInFormProps = Readonly<{
  firm: string | null;
  /** Accounts of the demo, one press each; empty in the real thing. */
  people: readonly Readonly<{ email: string; role: string }>[];
  wanted: string;
}>;

const CELL = "border-frame px-3.5 pt-[7px] pb-[9px]";
const INPUT = "h-[34px] w-full px-2 text-lead max-md:h-11";

/** The sign-in as the title block of the sheet. What was typed stays when it is refused. */
export function SignInForm({ firm, people, wanted }: SignInFormProps) {
  const [email, setEmail] = useState("");
  const [password, setPassword] = useState("");
  const [refused, setRefused] = useState<string | null>(null);
  const [atWork, setAtWork] = useState(false);
  const passwordInput = useRef<HTMLInputElement>(null);

  const signIn = async (event: FormEvent) => {
    event.preventDefault();
    if (!email.trim() || !password) {
      setRefused(email.trim() ? "The password is missing." : "The e-mail address is missing.");
      return;
    }
    setAtWork(true);
    setRefused(null);
    try {
      await api.post("/session", { body: { email: email.trim(), password } });
      window.location.assign(wanted);
    } catch (cause) {
      setAtWork(false);
      setRefused(
        cause instanceof ApiProblem && cause.status === 401
          ? "This e-mail and password do not belong together. Both are kept as you typed them."
          : sentenceOf(cause),
      );
      passwordInput.current?.focus();
    }
  };

  return (
    <form
      noValidate
      onSubmit={signIn}
      className="grid w-full max-w-[620px] flex-none grid-cols-2 border-t-2 border-l-2 border-frame bg-sheet max-lg:max-w-none max-lg:border-l-0 max-sm:grid-cols-1"
    >
      <div className="flex items-center gap-3.5 border-b border-frame p-3.5 text-[30px] leading-9 font-[700] tracking-[-.01em]">
        <BrandMark className="size-11" />
        Flitchbook
      </div>
      <div className={cx(CELL, "flex flex-col justify-between border-b border-l max-sm:border-l-0")}>
        <span className="text-micro text-ink-2">Firm</span>
        <b className="text-[17px] leading-[22px]">{firm ?? "as your account says"}</b>
      </div>
      <label className={cx(CELL, "border-b")}>
        <span className="mb-[3px] block text-note text-ink-2">E-mail</span>
        <input
          type="email"
          name="email"
          autoComplete="username"
          autoFocus
          required
          aria-invalid={refused !== null || undefined}
          aria-describedby="sign-in-refused"
          value={email}
          onChange={(event) => setEmail(event.target.value)}
          className={cx(fieldClass({ refused: refused !== null }), INPUT)}
        />
      </label>
      <label className={cx(CELL, "border-b border-l max-sm:border-l-0")}>
        <span className="mb-[3px] block text-note text-ink-2">Password</span>
        <input
          ref={passwordInput}
          type="password"
          name="password"
          autoComplete="current-password"
          required
          aria-invalid={refused !== null || undefined}
          aria-describedby="sign-in-refused"
          value={password}
          onChange={(event) => setPassword(event.target.value)}
          className={cx(fieldClass({ refused: refused !== null }), INPUT)}
        />
      </label>
      <div className="col-span-full flex min-h-16 flex-wrap items-center gap-x-2.5 gap-y-2 px-3.5 py-3">
        <p
          id="sign-in-refused"
          role="alert"
          className="flex min-w-0 flex-1 basis-52 gap-1.5 text-table text-oxide-ink"
        >
          {refused && (
            <>
              <RefusedSign className="mt-0.5" />
              <span>{refused}</span>
            </>
          )}
          {!refused && people.length > 0 && (
            <span className="text-note text-ink-2">
              Demo accounts:{" "}
              {people.map((person, i) => (
                <span key={person.email}>
                  {i > 0 && ", "}
                  <button
                    type="button"
                    className="link min-h-6 max-md:min-h-11"
                    title={person.email}
                    onClick={() => {
                      setEmail(person.email);
                      passwordInput.current?.focus();
                    }}
                  >
                    {person.role}
                  </button>
                </span>
              ))}
            </span>
          )}
        </p>
        <Button type="submit" kind="main" size="large" atWork={atWork}>
          Sign in
        </Button>
      </div>
    </form>
  );
}
