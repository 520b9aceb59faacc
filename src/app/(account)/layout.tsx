import type { ReactNode } from "react";
import { AccountShell } from "@/components/account-shell";
import { PressButton } from "@/components/form/press-button";
import { signOutAction } from "@/features/account/actions";
import { requestContext } from "@/lib/request-context";

export default async function AccountLayout({ children }: Readonly<{ children: ReactNode }>) {
  const { actor } = await requestContext();
  const isUser = actor.type === "user";
  return (
    <AccountShell
      isEducator={isUser && actor.grants.some((g) => g.role === "educator")}
      isAdministrator={isUser && actor.isAdministrator}
      signOut={isUser ? <PressButton action={signOutAction} label="Sign out" look="link" /> : null}
    >
      {children}
    </AccountShell>
  );
}
