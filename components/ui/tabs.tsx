"use client";
import type { ComponentProps } from "react";
import { Tabs as Radix } from "radix-ui";
import { cx } from "@/components/ui/cx";

export const Tabs = Radix.Root;
export const TabPanel = Radix.Content;

export const TabList = ({ className, ...rest }: ComponentProps<typeof Radix.List>) => (
  <Radix.List className={cx("flex flex-none border-b border-frame bg-panel", className)} {...rest} />
);

export const Tab = ({ className, ...rest }: ComponentProps<typeof Radix.Trigger>) => (
  <Radix.Trigger
    className={cx(
      "h-8 border-r border-rule px-3 font-medium text-ink-2 hover:bg-wash max-md:h-11",
      "data-[state=active]:bg-sheet data-[state=active]:font-[640] data-[state=active]:text-ink data-[state=active]:shadow-[inset_0_3px_0_var(--fb-oxide-ink)]",
      className,
    )}
    {...rest}
  />
);
