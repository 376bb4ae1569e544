"use client";
import Link from "next/link";
import { useState, type FormEvent } from "react";
import { EntryBlock, EntryFact, EntryField } from "@/components/entry/entry-block";
import { PASSWORD_RULE, passwordFault } from "@/components/entry/password-rule";
import { api, ApiProblem, sentenceOf } from "@/lib/client/api";
import type { ShownInvitation } from "@/lib/schemas/invitation";
import type { Me } from "@/lib/schemas/session";

type InvitationFormProps = Readonly<{ token: string; shown: ShownInvitation }>;
type Refusal = Readonly<{ field: "name" | "password" | null; says: string }>;

const REFUSED = "invitation-refused";

/** Signs in to the firm the invitation was for; somebody may belong to others too. */
const signInTo = async (firm: string, email: string, password: string): Promise<void> => {
  await api.post("/session", { body: { email, password } });
  const { data: me } = await api.get<Me>("/me");
  const joined = me.organisations.find(({ name }) => name === firm);
  if (joined && joined.id !== me.organisation.id)
    await api.post("/session", { body: { email, password, organisation: joined.id } });
};

const fieldOf = (cause: unknown): Refusal["field"] => {
  if (!(cause instanceof ApiProblem)) return null;
  if (cause.issueAt("/password")) return "password";
  return cause.issueAt("/name") ? "name" : null;
};

/** Accepts an invitation: a new person chooses name and password, a known one proves who they are. */
export function InvitationForm({ token, shown }: InvitationFormProps) {
  const { email, organisation, known } = shown;
  const [name, setName] = useState(shown.name);
  const [password, setPassword] = useState("");
  const [refusal, setRefusal] = useState<Refusal | null>(null);
  const [atWork, setAtWork] = useState(false);
  const [accepted, setAccepted] = useState(false);

  const faultOf = (): Refusal | null => {
    if (!known && !name.trim()) return { field: "name", says: "Your name is missing." };
    if (known && !password) return { field: "password", says: "The password of your account is missing." };
    const fault = known ? null : passwordFault(password);
    return fault === null ? null : { field: "password", says: fault };
  };

  const accept = async (event: FormEvent) => {
    event.preventDefault();
    if (atWork) return;
    const fault = faultOf();
    setRefusal(fault);
    if (fault) return;
    setAtWork(true);
    try {
      await api.post("/invitations/accept", {
        body: { token, password, ...(!known && { name: name.trim() }) },
      });
    } catch (cause) {
      setAtWork(false);
      setRefusal({ field: fieldOf(cause), says: sentenceOf(cause) });
      return;
    }
    setAccepted(true);
    try {
      await signInTo(organisation, email, password);
      window.location.assign("/rack");
    } catch (cause) {
      setAtWork(false);
      setRefusal({ field: null, says: `You are not signed in yet. ${sentenceOf(cause)}` });
    }
  };

  const firm = (
    <EntryFact label="Firm" right>
      {organisation}
    </EntryFact>
  );
  if (accepted) {
    return (
      <EntryBlock
        beside={firm}
        refusedId={REFUSED}
        refused={
          refusal && (
            <>
              The invitation is accepted. {refusal.says}{" "}
              <Link href="/sign-in" className="link">
                Go to the sign-in
              </Link>
            </>
          )
        }
        word="The invitation is accepted. The book opens."
      />
    );
  }
  return (
    <EntryBlock
      beside={firm}
      refusedId={REFUSED}
      refused={refusal?.says}
      action="Accept"
      atWork={atWork}
      onSubmit={accept}
    >
      <EntryFact label="E-mail">{email}</EntryFact>
      <EntryFact label="Role" right>
        {shown.role}
      </EntryFact>
      {/* The password manager keeps the password under this address. */}
      <input type="hidden" name="email" autoComplete="username" value={email} />
      {known ? (
        <EntryFact label="Name">{shown.name}</EntryFact>
      ) : (
        <EntryField
          label="Name"
          name="name"
          autoComplete="name"
          required
          maxLength={120}
          note="As it stands beside what you check and release."
          value={name}
          onChange={(event) => setName(event.target.value)}
          refused={refusal?.field === "name"}
          refusedId={REFUSED}
        />
      )}
      <EntryField
        label={known ? "Password of your account" : "New password"}
        type="password"
        name="password"
        autoComplete={known ? "current-password" : "new-password"}
        required
        {...(!known && { note: PASSWORD_RULE })}
        value={password}
        onChange={(event) => setPassword(event.target.value)}
        refused={refusal?.field === "password"}
        refusedId={REFUSED}
        right
      />
    </EntryBlock>
  );
}
