import type { ReactNode } from "react";
import { PressButton } from "@/components/form/press-button";
import { Shell } from "@/components/shell";
import { signOutAction } from "@/features/account/actions";
import { requestContext } from "@/lib/request-context";

export default async function AccountLayout({ children }: Readonly<{ children: ReactNode }>) {
  const { actor } = await requestContext();
  const word = (href: string, label: string) => ({ href, label, isCurrent: false });
  const isEducator = actor.type === "user" && actor.grants.some((g) => g.role === "educator");
  const words = [
    word("/journals", "Journals"),
    ...(isEducator ? [word("/review", "Reviews")] : []),
    word("/account", "Account"),
    ...(actor.type === "user" && actor.isAdministrator ? [word("/administration", "Administration")] : []),
  ];
  return (
    <Shell home="/journals" words={words} more={[word("/help", "Help")]} footer={actor.type === "user" ? <footer className="no-print border-t border-hairline py-4"><PressButton action={signOutAction} label="Sign out" look="link" /></footer> : null}>
      {children}
    </Shell>
  );
}
