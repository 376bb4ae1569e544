import type { ComponentProps } from "react";
import { ChevronSign } from "@/components/ui/signs";

type PersonFaceProps = ComponentProps<"button"> & Readonly<{ name: string; role: string }>;

/** Name and role in the strip: the trigger of the person's menu. */
export const PersonFace = ({ name, role, ...rest }: PersonFaceProps) => (
  <button
    type="button"
    {...rest}
    className="flex h-7 items-center gap-1.5 px-1 text-table whitespace-nowrap text-ink-2 hover:text-ink max-md:h-11"
  >
    <span>
      <b className="font-[560] text-ink">{name}</b>
      <span className="max-sm:hidden">, {role}</span>
    </span>
    <ChevronSign />
  </button>
);
