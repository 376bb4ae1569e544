"use client";
import { useState, type FormEvent } from "react";
import { EntryBlock, EntryFact, EntryField } from "@/components/entry/entry-block";
import { api, sentenceOf } from "@/lib/client/api";

const REFUSED = "ask-refused";

/** Asks for the letter. The answer is the same whether or not there is such an account. */
export function AskForLetterForm() {
  const [email, setEmail] = useState("");
  const [refused, setRefused] = useState<string | null>(null);
  const [askedFor, setAskedFor] = useState<string | null>(null);
  const [atWork, setAtWork] = useState(false);

  const ask = async (event: FormEvent) => {
    event.preventDefault();
    if (atWork) return;
    const address = email.trim();
    setAskedFor(null);
    setRefused(address ? null : "The e-mail address is missing.");
    if (!address) return;
    setAtWork(true);
    try {
      await api.post("/password-resets", { body: { email: address } });
      setAskedFor(address);
    } catch (cause) {
      setRefused(sentenceOf(cause));
    }
    setAtWork(false);
  };

  return (
    <EntryBlock
      beside={
        <EntryFact label="Letter" right>
          Forgotten password
        </EntryFact>
      }
      refusedId={REFUSED}
      refused={refused}
      word={askedFor && `If ${askedFor} has an account, a letter is on its way to it.`}
      action="Send the letter"
      atWork={atWork}
      onSubmit={ask}
    >
      <div className="col-span-full grid">
        <EntryField
          label="E-mail"
          type="email"
          name="email"
          autoComplete="username"
          autoFocus
          required
          value={email}
          onChange={(event) => setEmail(event.target.value)}
          refused={refused !== null}
          refusedId={REFUSED}
        />
      </div>
    </EntryBlock>
  );
}
