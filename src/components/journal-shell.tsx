"use client";

import { usePathname } from "next/navigation";
import type { ReactNode } from "react";
import { Shell, type NavWord } from "./shell";

const DESK = [
  ["today", "Today"], ["days", "Days"], ["changes", "Changes"], ["compare", "Compare"], ["plan", "Plan"], ["circle", "Circle"], ["data", "Data"],
] as const;
const PHONE = [["today", "Today"], ["days", "Days"], ["changes", "Changes"], ["compare", "Compare"], ["more", "More"]] as const;
/** The pages behind the phone's last word. */
const BEHIND_MORE = ["more", "plan", "circle", "data", "fallback", "start"];

/** The frame of a journal: its words, and the fallback card one press away on every page. */
export function JournalShell({
  journalId, isOwner, children,
}: Readonly<{ journalId: string; isOwner: boolean; children: ReactNode }>) {
  const base = `/j/${journalId}`;
  const room = usePathname().slice(base.length + 1).split("/")[0] ?? "";
  const word = (path: string, label: string, isCurrent = room === path): NavWord => ({ href: `${base}/${path}`, label, isCurrent });
  const shown = DESK.filter(([path]) => isOwner || path !== "data");
  const inCircle = (path: string, label: string): readonly [string, string] =>
    !isOwner && path === "circle" ? ["circle/comments", "Comments"] : [path, label];
  return (
    <Shell
      home={`${base}/today`}
      words={shown.map(([path, label]) => word(...inCircle(path, label), room === path))}
      more={[word("fallback", "Fallback card"), { href: "/journals", label: "Journals", isCurrent: false }]}
      phoneWords={PHONE.map(([path, label]) => word(path, label, path === "more" ? BEHIND_MORE.includes(room) : room === path))}
    >
      {children}
    </Shell>
  );
}
