"use client";

import { usePathname } from "next/navigation";
import type { ReactNode } from "react";
import { Shell } from "./shell";

/** The frame of the pages between journals. */
export function AccountShell({
  isEducator, isAdministrator, signOut, children,
}: Readonly<{ isEducator: boolean; isAdministrator: boolean; signOut: ReactNode; children: ReactNode }>) {
  const path = usePathname();
  const word = (href: string, label: string) => ({ href, label, isCurrent: path === href || path.startsWith(`${href}/`) });
  const words = [
    word("/journals", "Journals"),
    ...(isEducator ? [word("/review", "Reviews")] : []),
    word("/account", "Account"),
    ...(isAdministrator ? [word("/administration", "Administration")] : []),
  ];
  return (
    <Shell home="/journals" words={words} more={[word("/help", "Help")]} footer={<footer className="no-print border-t border-hairline py-4">{signOut}</footer>}>
      {children}
    </Shell>
  );
}
