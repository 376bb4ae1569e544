"use client";
import dynamic from "next/dynamic";
import { useState } from "react";
import { PersonFace } from "@/components/sheet/person-face";

type PersonProps = Readonly<{ name: string; role: string }>;

/** Who is here. The menu is fetched at the first press and opens at once: pages that must be light do not carry it. */
export function Person({ name, role }: PersonProps) {
  const [wanted, setWanted] = useState(false);
  if (!wanted)
    return <PersonFace name={name} role={role} aria-haspopup="menu" onClick={() => setWanted(true)} />;
  return <PersonMenu name={name} role={role} />;
}

const PersonMenu = dynamic(() => import("@/components/sheet/person-menu"), { ssr: false });
